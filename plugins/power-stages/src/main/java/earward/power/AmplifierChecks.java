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

  private static final double MOST_WHISTLE_RMS_VOLTS = 3e-3;
  private static final double MOST_OVERDRIVE_DECIBELS = 6;
  private static final double MOST_METAL_CELSIUS = 60;
  private static final double MOST_PLASTIC_CELSIUS = 77;

  private AmplifierChecks() {}

  static List<Check> of(
      Values values, AmplifierModel model, Conditions conditions, String exitNode) {
    List<Check> checks = new ArrayList<>(supplyAndHeat(values, model));
    checks.addAll(signal(model));
    checks.add(
        Check.atMost(
            "coupling-edge",
            Severity.WEIGH,
            new FigureName(exitNode, Quantity.LOW_EDGE_HERTZ, CaseName.TEST),
            conditions.lowestToneHertz(),
            "the kit design's own audio band",
            moreBass(model)));
    return checks;
  }

  private static List<Check> supplyAndHeat(Values values, AmplifierModel model) {
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
        Check.atLeast(
            "load-below-least",
            Severity.STOP,
            new FigureName("amplifier", Quantity.LOAD_OHMS, CaseName.FULL_OUTPUT),
            model.ratings().leastLoadOhms(),
            "least load of the " + model.name() + ", as the parts library has it"),
        touch(values));
  }

  private static List<Check> signal(AmplifierModel model) {
    List<Check> checks = new ArrayList<>();
    checks.add(
        Check.atMost(
            "carrier-in-audio",
            Severity.WEIGH,
            new FigureName("in", Quantity.CARRIER_RMS_VOLTS, CaseName.STRONG),
            MOST_CARRIER_RMS_VOLTS,
            "common practice: a bipolar input pair detects what comes near half of kT/q"));
    checks.add(whistle("second-carrier-in-audio", Quantity.SECOND_CARRIER_RMS_VOLTS));
    checks.add(whistle("third-carrier-in-audio", Quantity.THIRD_CARRIER_RMS_VOLTS));
    checks.add(
        Check.atMost(
            "strong-overdrive",
            Severity.NOTE,
            new FigureName("amplifier", Quantity.OVERLOAD_DECIBELS, CaseName.STRONG),
            MOST_OVERDRIVE_DECIBELS,
            "common practice: what a listener takes back at the knob without a word"));
    double mostRms = model.traits().mostInputVolts() / Math.sqrt(2);
    if (Double.isFinite(mostRms)) {
      for (CaseName caseName : List.of(CaseName.STRONG, CaseName.FULL_VOLUME)) {
        checks.add(
            Check.atMost(
                "input-overload",
                Severity.WEIGH,
                new FigureName("in", Quantity.AUDIO_RMS_VOLTS, caseName),
                mostRms,
                "highest input of the " + model.name() + ", as the parts library has it"));
      }
    }
    return checks;
  }

  /** Twice and three times the IF fall on the AM bands, where the aerial takes them up again. */
  private static Check whistle(String code, Quantity quantity) {
    return Check.atMost(
        code,
        Severity.WEIGH,
        new FigureName("in", quantity, CaseName.STRONG),
        MOST_WHISTLE_RMS_VOLTS,
        "judgement: what an output stage and its leads may carry beside a loop aerial");
  }

  private static Check touch(Values values) {
    boolean cooled = values.chosen("cooling", "heat-sink");
    return Check.atMost(
        "touch-temperature",
        Severity.WEIGH,
        new FigureName("amplifier", Quantity.SURFACE_CELSIUS, CaseName.HOTTEST),
        cooled ? MOST_METAL_CELSIUS : MOST_PLASTIC_CELSIUS,
        "IEC 62368-1 table 38, touched for 1 to 10 s: metal 60 °C (from memory), plastic 77 °C",
        cooled ? RemedyHint.lower("heat-sink") : RemedyHint.change("cooling"));
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
