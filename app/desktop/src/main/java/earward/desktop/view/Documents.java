package earward.desktop.view;

import earward.desktop.model.Preferences;
import earward.desktop.model.Recovery;
import earward.kit.design.KitDesign;
import java.nio.file.Path;
import java.util.List;

/** What a start page can begin with. */
interface Documents {
  /** Begins with an empty path. */
  void startEmpty();

  /** Begins with a copy of a design that has no file of its own yet. */
  void startFrom(KitDesign design);

  /** Opens a file. */
  void open(Path file);

  /** Asks for a file and opens it. */
  void openChosen();

  /** Goes on with what a program that was ended had left. */
  void recover(Recovery.Left left);

  /** What was left. */
  List<Recovery.Left> left();

  /** What the user prefers. */
  Preferences preferences();
}
