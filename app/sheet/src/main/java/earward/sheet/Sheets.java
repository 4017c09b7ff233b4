package earward.sheet;

import earward.kit.file.Designs;
import earward.kit.review.ReviewedKit;
import earward.sheet.content.SheetContent;
import earward.sheet.internal.gather.Gathered;
import earward.sheet.internal.section.Words;
import earward.sheet.wording.Wording;
import earward.study.limits.KitLimits;

/** Makes the content of build sheets from reviewed kits. Nothing is solved here. */
public final class Sheets {
  private Sheets() {}

  /**
   * The sheet of a kit, in the language and on the paper that its design names. A kit without
   * figures has a sheet too: its findings say why, and dashes stand where figures would.
   *
   * @param kit as it was reviewed
   */
  public static SheetContent of(ReviewedKit kit) {
    return of(kit, Wording.of(kit.solved().assembly().design().sheet().language()));
  }

  /**
   * The sheet of a kit in a wording of the caller's choice.
   *
   * @param kit as it was reviewed
   * @param wording the words; hand the same one to the writer
   */
  public static SheetContent of(ReviewedKit kit, Wording wording) {
    return of(kit, wording, KitLimits.NONE);
  }

  /**
   * The same with limits of its readings beside the expected values.
   *
   * @param limits as they were worked out; {@link KitLimits#NONE} for none
   */
  public static SheetContent of(ReviewedKit kit, Wording wording, KitLimits limits) {
    return Gathered.of(
        kit, Designs.digest(kit.solved().assembly().design()), Words.of(wording), limits);
  }
}
