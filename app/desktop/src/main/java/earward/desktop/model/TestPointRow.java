package earward.desktop.model;

import earward.block.BlockTexts;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.kit.design.QuantityText;
import earward.kit.path.PlacedTestPoint;
import earward.kit.review.ReviewedKit;
import java.util.List;
import java.util.Locale;

/**
 * A test point with its solved figures, as text.
 *
 * @param reference for instance TP3
 * @param where in words
 * @param figures DC at rest and with the test signal, audio, distortion, carrier
 */
public record TestPointRow(String reference, String where, List<String> figures) {
  /** Below this nothing is there that a builder could call a reading, in V. */
  private static final double LEAST_VOLTS = 20e-6;

  public TestPointRow {
    figures = List.copyOf(figures);
  }

  /** The columns of {@link #figures}, as keys of the window's words. */
  public static List<String> columns() {
    return List.of("column.dc-rest", "column.dc-test", "column.audio", "column.thd", "column.rf");
  }

  /** All test points of a kit. */
  public static List<TestPointRow> of(ReviewedKit kit) {
    return kit.solved().assembly().testPoints().stream().map(point -> row(kit, point)).toList();
  }

  private static TestPointRow row(ReviewedKit kit, PlacedTestPoint point) {
    return new TestPointRow(
        point.reference(),
        where(kit, point),
        List.of(
            text(kit, point.place(), Quantity.DC_VOLTS, CaseName.NO_SIGNAL),
            text(kit, point.place(), Quantity.DC_VOLTS, CaseName.TEST),
            text(kit, point.place(), Quantity.AUDIO_RMS_VOLTS, CaseName.TEST),
            text(kit, point.place(), Quantity.DISTORTION, CaseName.TEST),
            text(kit, point.place(), Quantity.CARRIER_RMS_VOLTS, CaseName.TEST)));
  }

  private static String where(ReviewedKit kit, PlacedTestPoint point) {
    int dot = point.place().indexOf('.');
    if (!point.words().isEmpty() || dot < 0) {
      return point.words();
    }
    String id = point.place().substring(dot + 1);
    return kit.solved()
        .assembly()
        .block(point.place().substring(0, dot))
        .flatMap(block -> BlockTexts.of(block.type(), Locale.ENGLISH).find("test-point." + id))
        .orElse(point.place());
  }

  private static String text(ReviewedKit kit, String place, Quantity quantity, CaseName name) {
    double value = kit.figures().find(place, quantity, name).orElse(Double.NaN);
    boolean volts = quantity != Quantity.DISTORTION;
    if (Double.isNaN(value) || (!volts && !(value < 10))) {
      return "–";
    }
    return volts && Math.abs(value) < LEAST_VOLTS
        ? "0 V"
        : QuantityText.format(value, quantity.unit(), Locale.ENGLISH);
  }
}
