package earward.kit.review;

import static earward.block.figure.CaseName.BATTERY_LOW;
import static earward.block.figure.CaseName.HIGHEST_SUPPLY;
import static earward.block.figure.CaseName.NO_SIGNAL;
import static earward.block.figure.CaseName.STRONG;

import earward.block.check.Check;
import earward.block.check.Severity;
import earward.block.device.Capacitor;
import earward.block.device.Potentiometer;
import earward.block.device.Regulator;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.CircuitPart;
import earward.kit.path.Assembly;
import java.util.ArrayList;
import java.util.List;

/** What every part of a kit bears, whichever block it belongs to, as data. */
final class PartChecks {
  /** An aluminium electrolytic is harmed from about 1 V the wrong way round (common practice). */
  private static final double MOST_REVERSE_VOLTS = 0.5;

  /** A small carbon track of audio taper (common practice: 50 mW). */
  private static final double TRACK_WATTS = 0.05;

  private static final List<CaseName> AT_REST_AND_AT_WORST =
      List.of(NO_SIGNAL, STRONG, HIGHEST_SUPPLY);
  private static final List<CaseName> AT_WORST = List.of(STRONG, HIGHEST_SUPPLY);

  private final Assembly assembly;
  private final List<KitCheck> checks = new ArrayList<>();

  private PartChecks(Assembly assembly) {
    this.assembly = assembly;
  }

  static List<KitCheck> of(Assembly assembly) {
    PartChecks all = new PartChecks(assembly);
    assembly.circuit().parts().forEach(all::take);
    return all.checks;
  }

  private void take(CircuitPart part) {
    if (part.device() instanceof Capacitor capacitor) {
      capacitor(part, capacitor);
    } else if (part.device() instanceof Resistor resistor) {
      heat(part, "resistor-dissipation", resistor.ratedWatts(), "the resistor's rated dissipation");
    } else if (part.device() instanceof Potentiometer) {
      heat(
          part,
          "potentiometer-dissipation",
          TRACK_WATTS,
          "common practice: a small carbon track of audio taper bears 50 mW");
    } else if (part.device() instanceof Regulator regulator) {
      dropOut(part, regulator);
    }
  }

  private void capacitor(CircuitPart part, Capacitor capacitor) {
    double rated = capacitor.ratedVolts();
    for (CaseName name : AT_REST_AND_AT_WORST) {
      FigureName drop = new FigureName(part.name(), Quantity.DROP_VOLTS, name);
      String source = "rated voltage of the capacitor";
      add(part, Check.atMost("capacitor-voltage", Severity.STOP, drop, rated, source));
      if (!capacitor.dielectric().polarised()) {
        add(part, Check.atLeast("capacitor-voltage", Severity.STOP, drop, -rated, source));
      } else if (!name.equals(HIGHEST_SUPPLY)) {
        add(
            part,
            Check.atLeast(
                "capacitor-reversed",
                Severity.STOP,
                drop,
                -MOST_REVERSE_VOLTS,
                "common practice: half of what begins to harm an aluminium electrolytic"));
      }
    }
  }

  private void heat(CircuitPart part, String code, double watts, String source) {
    for (CaseName name : AT_WORST) {
      FigureName heat = new FigureName(part.name(), Quantity.DISSIPATION_WATTS, name);
      add(part, Check.atMost(code, Severity.STOP, heat, watts, source));
    }
  }

  private void dropOut(CircuitPart part, Regulator regulator) {
    String input = String.valueOf(part.nodes().get(Terminal.INPUT));
    add(
        part,
        Check.atLeast(
            "regulator-drop-out",
            Severity.WEIGH,
            new FigureName(input, Quantity.DC_VOLTS, BATTERY_LOW),
            regulator.model().outputVolts() + regulator.model().dropOutVolts(),
            "drop-out voltage of the "
                + regulator.model().name()
                + ", as the parts library has it"));
  }

  private void add(CircuitPart part, Check check) {
    String block = part.name().substring(0, Math.max(0, part.name().indexOf('.')));
    String reference = assembly.references().ofPart(part.name()).orElse(part.name());
    checks.add(new KitCheck(check, block, reference, false));
  }
}
