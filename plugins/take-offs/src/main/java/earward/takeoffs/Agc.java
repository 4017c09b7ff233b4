package earward.takeoffs;

import static earward.block.device.Terminal.A;
import static earward.block.device.Terminal.B;
import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.device.Capacitor;
import earward.block.device.Resistor;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * The AGC line: a resistor from the detector into a capacitor, and the resistance that the front
 * end puts on the line. The loop through the front end is left open.
 */
public final class Agc implements BlockType {
  private static final double RATED_VOLTS = 25;

  /** What a line may stand at the other way without harm, V. */
  private static final double STILL_VOLTS = 0.05;

  @Override
  public String id() {
    return "take-off.agc";
  }

  @Override
  public Role role() {
    return Role.TAKE_OFF;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Choice("direction", List.of("positive", "negative")),
        new Setting.Value("series-ohms", Unit.OHM, 33e3, 100, 10e6, Series.E12),
        new Setting.Value("capacitor", Unit.FARAD, 10e-6, 10e-9, 1e-3, Series.E6),
        new Setting.Value("load-ohms", Unit.OHM, 47e3, 100, 100e6, Series.E12));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    Capacitor capacitor = Capacitor.of(values.amount("capacitor"), RATED_VOLTS);
    WiringPlan plan =
        Wiring.from(new Single("in"))
            .run("r-agc", new Resistor(values.amount("series-ohms")), "agc")
            .down("c-agc", capacitor, values.chosen("direction", "positive") ? A : B, GROUND)
            .down("r-load", new Resistor(values.amount("load-ohms")), GROUND)
            .testPoint("agc", "agc")
            .fit("r-agc", "r-load", "c-agc");
    if (capacitor.dielectric().polarised()) {
      plan.caution("c-agc", Caution.POLARITY);
    }
    return new BlockDescription(plan.end(), List.of(direction(values)), List.of());
  }

  /** The line against its stated direction: its capacitor would stand reversed. */
  private static Check direction(Values values) {
    FigureName line = new FigureName("agc", Quantity.DC_VOLTS, CaseName.STRONG);
    String source = "common practice: an electrolytic capacitor is not reversed";
    return values.chosen("direction", "positive")
        ? Check.atLeast("agc-direction", Severity.WEIGH, line, -STILL_VOLTS, source)
        : Check.atMost("agc-direction", Severity.WEIGH, line, STILL_VOLTS, source);
  }

  @Override
  public List<Finding> judge(
      Values values, Conditions conditions, ToDoubleFunction<String> figure) {
    return List.of(Finding.inWords(Severity.NOTE, "agc-open-loop"));
  }
}
