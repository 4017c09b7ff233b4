package earward.power;

import earward.block.Conditions;
import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.AmplifierModel;
import earward.block.device.Terminal;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.setting.Values;
import java.util.ArrayList;
import java.util.List;

/** What must hold at an amplifier IC. */
final class AmplifierChecks {
  /** Carrier at the input above which a bipolar input pair begins to detect it. */
  private static final double MOST_CARRIER_RMS_VOLTS = 10e-3;

  private AmplifierChecks() {}

  static List<Check> of(
      Values values, AmplifierModel model, Conditions conditions, String exitNode) {
    return List.of(
        Check.atMost(
            "supply-above-maximum",
            Severity.STOP,
            new FigureName("amplifier", Quantity.SUPPLY_VOLTS, CaseName.HIGHEST_SUPPLY),
            model.ratings().mostVolts(),
            "absolute maximum supply of the " + model.name() + ", as the parts library has it"),
        Check.atLeast(
            "supply-below-minimum",
            Severity.WEIGH,
            new FigureName("amplifier", Quantity.SUPPLY_VOLTS, CaseName.BATTERY_LOW),
            model.ratings().leastVolts(),
            "lowest supply of the " + model.name() + ", as the parts library has it"),
        Check.atMost(
            "output-current",
            Severity.STOP,
            new FigureName("amplifier", Quantity.PEAK_AMPERES, CaseName.FULL_OUTPUT),
            model.ratings().mostPeakAmperes(),
            "highest output current of the " + model.name() + ", as the parts library has it"),
        Check.atMost(
            "junction-temperature",
            Severity.STOP,
            new FigureName("amplifier", Quantity.JUNCTION_CELSIUS, CaseName.HOTTEST),
            model.ratings().mostJunctionCelsius(),
            "highest junction temperature of the " + model.name() + ", as the parts library has it",
            values.chosen("cooling", "heat-sink")
                ? RemedyHint.lower("heat-sink")
                : RemedyHint.change("cooling")),
        Check.atMost(
            "carrier-in-audio",
            Severity.WEIGH,
            new FigureName("in", Quantity.CARRIER_RMS_VOLTS, CaseName.STRONG),
            MOST_CARRIER_RMS_VOLTS,
            "common practice: a bipolar input pair detects what comes near half of kT/q"),
        Check.atMost(
            "coupling-edge",
            Severity.WEIGH,
            new FigureName(exitNode, Quantity.LOW_EDGE_HERTZ, CaseName.TEST),
            conditions.lowestToneHertz(),
            "the kit design's own audio band",
            moreBass(model)));
  }

  private static RemedyHint[] moreBass(AmplifierModel model) {
    List<RemedyHint> hints = new ArrayList<>();
    if (!model.bridge()) {
      hints.add(RemedyHint.raise("output-capacitor"));
    }
    if (model.has(Terminal.GAIN)) {
      hints.add(RemedyHint.raise("gain-capacitor"));
    }
    return hints.toArray(RemedyHint[]::new);
  }
}
