package earward.filters;

import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.Resistor;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.law.DeEmphasis;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The receiver's half of a transmitter's pre-emphasis: the North American AM curve with its second
 * corner, or a plain time constant. The resistors are the nearest of the series for the capacitor,
 * with what stands before and after it taken into account.
 *
 * <p>Source: series R1, then R2 and C to ground: pole (R1 + R2)·C, zero R2·C (NRSC-1 for the two
 * corners; the network in any text).
 */
public final class DeEmphasisNetwork implements BlockType {
  private static final String NORTH_AMERICAN = "north-american";

  /** How far the solved edge may lie off the curve's own (judgement). */
  private static final double LEEWAY = 1.2;

  private static final double LEAST_OHMS = 10;
  private static final double MOST_SOURCE_OHMS = 1e6;
  private static final double LEAST_LOAD_OHMS = 100;
  private static final double MOST_LOAD_OHMS = 100e6;

  @Override
  public String id() {
    return "filter.de-emphasis";
  }

  @Override
  public Role role() {
    return Role.AUDIO_FILTER;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Choice("curve", List.of(NORTH_AMERICAN, "75-us", "50-us")),
        new Setting.Value("farads", Unit.FARAD, 10e-9, 100e-12, 1e-6, Series.E6),
        new Setting.Value("source-ohms", Unit.OHM, 1e3, 0, MOST_SOURCE_OHMS, Series.ANY),
        new Setting.Value(
            "load-ohms", Unit.OHM, 100e3, LEAST_LOAD_OHMS, MOST_LOAD_OHMS, Series.ANY));
  }

  /** R1 before it is rounded; not above 0 where source and load leave no room for it. */
  private static double seriesOhms(Values values) {
    double wanted =
        seconds(values) / values.amount("farads") - (northAmerican(values) ? shuntOhms(values) : 0);
    double load = values.amount("load-ohms");
    return wanted < load ? 1 / (1 / wanted - 1 / load) - values.amount("source-ohms") : -1;
  }

  private static double shuntOhms(Values values) {
    return DeEmphasis.NRSC_SECOND_SECONDS / values.amount("farads");
  }

  private static boolean northAmerican(Values values) {
    return values.chosen("curve", NORTH_AMERICAN);
  }

  private static double seconds(Values values) {
    return values.chosen("curve", "50-us") ? 50e-6 : DeEmphasis.NRSC_SECONDS;
  }

  static boolean goTogether(Values values) {
    return seriesOhms(values) >= LEAST_OHMS;
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    if (!goTogether(values)) {
      throw new IllegalArgumentException(
          "with this capacitor, source and load no series resistor gives the time constant; choose"
              + " a smaller capacitor where the source is too high, a larger one where the load is"
              + " too low");
    }
    WiringPlan plan =
        Wiring.from(new Single("in"))
            .run("r1", new Resistor(Series.E24.nearest(seriesOhms(values))), "out")
            .testPoint("out", "out")
            .fit("r1");
    if (northAmerican(values)) {
      plan.down("r2", new Resistor(Series.E24.nearest(shuntOhms(values))), "foot")
          .at("foot")
          .down("c1", Film.of(values.amount("farads")), GROUND)
          .fit("r2");
    } else {
      plan.down("c1", Film.of(values.amount("farads")), GROUND);
    }
    double edge =
        northAmerican(values) ? DeEmphasis.nrscEdgeHertz() : DeEmphasis.edgeHertz(seconds(values));
    FigureName solved = new FigureName("out", Quantity.HIGH_EDGE_HERTZ, CaseName.TEST);
    String source = "NRSC-1 and ITU-R BS.450, give or take a fifth";
    return BlockDescription.of(
        plan.fit("c1").to(new Single("out")),
        Check.atLeast(
            "edge-low", Severity.NOTE, solved, edge / LEEWAY, source, RemedyHint.lower("farads")),
        Check.atMost(
            "edge-high", Severity.NOTE, solved, edge * LEEWAY, source, RemedyHint.raise("farads")));
  }

  /**
   * Takes source and load over as they are, and the largest capacitor for which they leave a tenth
   * of the time constant to the load and half of it to R1.
   */
  @Override
  public Optional<Proposer> proposer() {
    return Optional.of(
        asked -> {
          double source = Math.min(MOST_SOURCE_OHMS / 100, Math.max(0, asked.sourceOhms()));
          double least = 2 * source + 1e3;
          double load = Math.min(MOST_LOAD_OHMS, Math.max(10 * least, asked.loadOhms()));
          double farads = Series.E6.nearest(seconds(asked.values()) / (2 * least));
          return Map.<String, SettingValue>of(
              "source-ohms", new SettingValue.Amount(source),
              "load-ohms", new SettingValue.Amount(load),
              "farads", new SettingValue.Amount(Math.min(1e-6, Math.max(100e-12, farads))));
        });
  }
}
