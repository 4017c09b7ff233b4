package earward.desktop.model;

import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.kit.design.QuantityText;
import earward.kit.review.ReviewedKit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * One of the figures that a designer watches.
 *
 * @param label what it is
 * @param value as people write it, a dash where it does not exist
 */
public record KeyFigure(String label, String value) {
  private record Wanted(String key, Quantity quantity, CaseName caseName) {}

  private static final List<Wanted> WATCHED =
      List.of(
          new Wanted("key.output", Quantity.OUTPUT_WATTS, CaseName.TEST),
          new Wanted("key.distortion", Quantity.DISTORTION, CaseName.TEST),
          new Wanted("key.clip", Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT),
          new Wanted("key.low", Quantity.LOW_EDGE_HERTZ, CaseName.TEST),
          new Wanted("key.high", Quantity.HIGH_EDGE_HERTZ, CaseName.TEST),
          new Wanted("key.depth", Quantity.CLIPPING_DEPTH, CaseName.DEEPEST),
          new Wanted("key.rest", Quantity.SUPPLY_AMPERES, CaseName.NO_SIGNAL),
          new Wanted("key.life", Quantity.BATTERY_HOURS, new CaseName("listening")));

  /** The watched figures of a kit. */
  public static List<KeyFigure> of(ReviewedKit kit) {
    List<KeyFigure> figures = new ArrayList<>();
    for (Wanted wanted : WATCHED) {
      double value =
          kit.figures().find("path", wanted.quantity(), wanted.caseName()).orElse(Double.NaN);
      figures.add(
          new KeyFigure(
              Words.of(wanted.key()),
              Double.isNaN(value)
                  ? "–"
                  : QuantityText.format(value, wanted.quantity().unit(), Locale.ENGLISH)));
    }
    return figures;
  }
}
