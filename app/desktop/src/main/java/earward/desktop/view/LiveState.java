package earward.desktop.view;

import earward.desktop.model.CaseView;
import earward.desktop.model.LiveValues;
import earward.desktop.model.Workbench;
import earward.kit.design.KitDesign;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** Keeps the live values up with the design and with the case that is looked at. */
final class LiveState {
  private final Workbench workbench;
  private final Runnable changed;
  private LiveValues values = LiveValues.NONE;
  private @Nullable KitDesign askedOf;
  private @Nullable CaseView askedIn;

  LiveState(Workbench workbench, Runnable changed) {
    this.workbench = workbench;
    this.changed = changed;
  }

  LiveValues values() {
    return values;
  }

  /** Takes the readings of the design where they are of this case; else has them solved. */
  void refresh() {
    CaseView view = workbench.caseView();
    Optional<LiveValues> own = LiveValues.of(workbench.readings(), view);
    if (own.isPresent()) {
      askedOf = null;
      values = own.get();
      return;
    }
    KitDesign design = workbench.shown();
    if (design.equals(askedOf) && view.equals(askedIn)) {
      return;
    }
    askedOf = design;
    askedIn = view;
    workbench
        .lanes()
        .live()
        .start(
            () -> LiveValues.solved(design, view, workbench.workshop()),
            solved -> {
              if (design.equals(askedOf) && view.equals(askedIn)) {
                values = solved;
                changed.run();
              }
            },
            fault -> {});
  }
}
