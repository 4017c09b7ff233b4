package earward.desktop.model;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import java.util.List;
import java.util.Optional;

/**
 * One of the figures that a designer watches.
 *
 * @param label what it is
 * @param figure the figure
 * @param unit of it
 * @param difference to the pinned baseline as people write it; empty where nothing is pinned
 */
public record KeyFigure(String label, ShownFigure figure, Unit unit, String difference) {
  private record Wanted(String key, Quantity quantity, CaseName caseName) {
    FigureName name() {
      return new FigureName("path", quantity, caseName);
    }
  }

  private static final List<Wanted> WATCHED =
      List.of(
          new Wanted("key.output", Quantity.OUTPUT_WATTS, CaseName.TEST),
          new Wanted("key.distortion", Quantity.DISTORTION, CaseName.TEST),
          new Wanted("key.clip", Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT),
          new Wanted("key.low", Quantity.LOW_EDGE_HERTZ, CaseName.TEST),
          new Wanted("key.high", Quantity.HIGH_EDGE_HERTZ, CaseName.TEST),
          new Wanted("key.depth", Quantity.CLEAN_DEPTH, CaseName.TEST),
          new Wanted("key.noise", Quantity.SIGNAL_TO_NOISE_DECIBELS, CaseName.TEST),
          new Wanted("key.rest", Quantity.SUPPLY_AMPERES, CaseName.NO_SIGNAL),
          new Wanted("key.life", Quantity.BATTERY_HOURS, new CaseName("listening")));

  /** The watched figures, beside those of the baseline. */
  public static List<KeyFigure> of(Readings readings, Optional<Baseline> baseline) {
    return WATCHED.stream()
        .map(
            wanted -> {
              ShownFigure figure = readings.find(wanted.name());
              double before =
                  baseline
                      .map(pinned -> pinned.kit().figures().orNaN(wanted.name()))
                      .orElse(Double.NaN);
              Unit unit = wanted.quantity().unit();
              return new KeyFigure(
                  Words.of(wanted.key()), figure, unit, difference(figure.value(), before, unit));
            })
        .toList();
  }

  /** The figure as people write it. */
  public String value() {
    return figure.text(unit);
  }

  /** The difference with its sign; empty where there is nothing to compare. */
  static String difference(double now, double before, Unit unit) {
    if (Double.isNaN(now) || Double.isNaN(before)) {
      return "";
    }
    double by = now - before;
    if (Math.abs(by) <= 1e-6 * Math.abs(before)) {
      return Words.of("key.same");
    }
    return (by > 0 ? "+" : "\u2212") + Amounts.of(Math.abs(by), unit);
  }
}
