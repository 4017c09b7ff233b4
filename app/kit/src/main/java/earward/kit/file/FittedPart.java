package earward.kit.file;

import earward.block.device.PartModel;
import earward.kit.parts.FitReport;
import java.util.Optional;

/**
 * A part as read, and how well its figures were fitted where they were.
 *
 * @param model the figures
 * @param fit empty where they are given
 */
record FittedPart(PartModel model, Optional<FitReport> fit) {
  /** A part whose figures are given. */
  static FittedPart given(PartModel model) {
    return new FittedPart(model, Optional.empty());
  }
}
