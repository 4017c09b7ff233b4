package earward.desktop.model;

import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import java.util.ArrayList;
import java.util.List;

/**
 * One line of what is known of a seam.
 *
 * @param label what it is
 * @param value as people write it
 * @param standing how far it may be trusted
 */
public record SeamFigures(String label, String value, Standing standing) {
  private record Wanted(String key, String place, Quantity quantity, CaseName caseName) {}

  /** What was solved of the seam by which a block is entered. */
  public static List<SeamFigures> of(KitDesign design, Readings readings, String blockId) {
    String seam = "seam." + blockId;
    String before = before(design, blockId);
    List<SeamFigures> rows = new ArrayList<>();
    for (Wanted wanted :
        List.of(
            new Wanted("seam.carrier", before, Quantity.CARRIER_RMS_VOLTS, CaseName.TEST),
            new Wanted("seam.weak", before, Quantity.AUDIO_RMS_VOLTS, CaseName.WEAK),
            new Wanted("seam.test", before, Quantity.AUDIO_RMS_VOLTS, CaseName.TEST),
            new Wanted("seam.strong", before, Quantity.AUDIO_RMS_VOLTS, CaseName.STRONG),
            new Wanted("seam.dc", before, Quantity.DC_VOLTS, CaseName.TEST),
            new Wanted("seam.backward", seam, Quantity.BACKWARD_OHMS, CaseName.TEST),
            new Wanted("seam.onward", seam, Quantity.ONWARD_OHMS, CaseName.TEST),
            new Wanted("seam.loss", seam, Quantity.LOADING_LOSS_DECIBELS, CaseName.TEST),
            new Wanted("seam.headroom", seam, Quantity.HEADROOM_DECIBELS, CaseName.TEST),
            new Wanted("seam.noise", seam, Quantity.NOISE_RMS_VOLTS, CaseName.TEST))) {
      ShownFigure figure = readings.find(wanted.place(), wanted.quantity(), wanted.caseName());
      if (figure.known()) {
        rows.add(
            new SeamFigures(
                Words.of(wanted.key()),
                wanted.quantity() == Quantity.NOISE_RMS_VOLTS
                    ? figure.text(wanted.quantity().unit())
                    : Amounts.reading(figure.value(), wanted.quantity().unit()),
                figure.standing()));
      }
    }
    return rows;
  }

  /** The block whose way out the seam is. */
  public static String before(KitDesign design, String blockId) {
    List<String> ids = design.path().stream().map(BlockEntry::id).toList();
    int at = ids.indexOf(blockId);
    return at > 0 ? ids.get(at - 1) : blockId;
  }
}
