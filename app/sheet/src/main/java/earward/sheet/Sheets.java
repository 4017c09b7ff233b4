package earward.sheet;

import earward.block.device.Device;
import earward.kit.file.Designs;
import earward.kit.review.ReviewedKit;
import earward.kit.stage.SolvedStage;
import earward.sheet.content.SheetContent;
import earward.sheet.internal.gather.Gathered;
import earward.sheet.internal.section.Words;
import earward.sheet.wording.Wording;
import earward.study.limits.KitLimits;
import java.util.List;

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
    return of(kit, List.of(), Wording.of(kit.solved().assembly().design().sheet().language()));
  }

  /**
   * The sheet of a kit with its build stages, in the language that its design names.
   *
   * @param kit as it was reviewed
   * @param stages of {@link earward.kit.stage.BuildStages}; none: the kit is tried as a whole only
   */
  public static SheetContent of(ReviewedKit kit, List<SolvedStage> stages) {
    return of(kit, stages, Wording.of(kit.solved().assembly().design().sheet().language()));
  }

  /**
   * The sheet of a kit in a wording of the caller's choice.
   *
   * @param kit as it was reviewed
   * @param stages of {@link earward.kit.stage.BuildStages}; none: the kit is tried as a whole only
   * @param wording the words; hand the same one to the writer
   */
  public static SheetContent of(ReviewedKit kit, List<SolvedStage> stages, Wording wording) {
    return of(kit, stages, wording, KitLimits.NONE);
  }

  /**
   * The same with limits of its readings beside the expected values.
   *
   * @param limits as they were worked out; {@link KitLimits#NONE} for none
   */
  public static SheetContent of(
      ReviewedKit kit, List<SolvedStage> stages, Wording wording, KitLimits limits) {
    return Gathered.of(
        kit, stages, Designs.digest(kit.solved().assembly().design()), Words.of(wording), limits);
  }

  /**
   * What is written beside a part on its drawing: its value, or the name of its type.
   *
   * @param device the part
   * @param language tag of the wording, for instance {@code en}
   */
  public static String partValue(Device device, String language) {
    return Gathered.partValue(device, Words.of(Wording.of(language)));
  }
}
