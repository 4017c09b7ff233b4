package earward.desktop.model;

import earward.kit.design.KitDesign;
import java.util.List;
import java.util.Optional;

/** A part of a design that is set line by line. */
interface Form {
  /** Its lines as they stand. */
  List<FormRow> rows(KitDesign design);

  /** What is wrong with words for a line, as one sentence; empty where nothing is. */
  Optional<String> fault(KitDesign design, FormRow row, String words);

  /** The design with a line changed to words that nothing is wrong with. */
  KitDesign edited(KitDesign design, FormRow row, String words);
}
