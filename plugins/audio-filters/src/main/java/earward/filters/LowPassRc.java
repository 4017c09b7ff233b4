package earward.filters;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Curve;
import earward.block.Role;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.law.RcEdge;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import java.util.List;

/**
 * One RC section that ends the audio band: by a corner, by a time constant, or by its parts. The
 * capacitor is the nearest of the series for the resistor; source and load move the corner, which
 * the solved figures show.
 */
public final class LowPassRc implements BlockType {
  private static final double LEAST_OHMS = 470;
  private static final double MOST_OHMS = 1e6;

  @Override
  public String id() {
    return "filter.low-pass-rc";
  }

  @Override
  public Role role() {
    return Role.AUDIO_FILTER;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Choice("given-by", List.of("corner", "time-constant", "parts")),
        new Setting.Value("corner-hertz", Unit.HERTZ, 4.5e3, 100, 50e3, Series.ANY),
        new Setting.Value("time-constant", Unit.SECOND, 75e-6, 3e-6, 2e-3, Series.ANY),
        new Setting.Value("r2", Unit.OHM, 4.7e3, LEAST_OHMS, MOST_OHMS, Series.E12),
        new Setting.Value("c2", Unit.FARAD, 6.8e-9, 10e-12, 4.7e-6, Series.E12));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    return new BlockDescription(
        RcSection.of(values.amount("r2"), farads(values)), List.of(), List.of(edgeOverR2(values)));
  }

  static double farads(Values values) {
    double ohms = values.amount("r2");
    return switch (values.choice("given-by")) {
      case "corner" -> Series.E12.nearest(RcEdge.farads(ohms, values.amount("corner-hertz")));
      case "time-constant" -> Series.E12.nearest(values.amount("time-constant") / ohms);
      case "parts" -> values.amount("c2");
      default ->
          throw new IllegalArgumentException("given-by is '" + values.choice("given-by") + "'");
    };
  }

  private static Curve edgeOverR2(Values values) {
    double ohms = values.amount("r2");
    return new Curve(
        "edge-over-r2",
        "r2",
        Math.max(LEAST_OHMS, ohms / 3),
        Math.min(MOST_OHMS, ohms * 3),
        21,
        List.of(new FigureName("out", Quantity.HIGH_EDGE_HERTZ, CaseName.TEST)));
  }
}
