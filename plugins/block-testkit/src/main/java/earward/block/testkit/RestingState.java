package earward.block.testkit;

import earward.block.BlockDescription;
import earward.block.check.Check;
import earward.block.check.Severity;
import earward.block.device.BipolarTransistor;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Terminal;
import earward.block.device.TransistorModel;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.block.wiring.Nodes;
import earward.block.wiring.WiredPart;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.ToDoubleFunction;

/**
 * How diodes and transistors of a block rest in the trial kits: for the author to look at, no
 * fault. A bias diode the wrong way round is seen here, and in nothing else that is sure. Not safe
 * for several threads.
 */
final class RestingState {
  /** Below it a part carries nothing worth the name. */
  private static final double LEAST_AMPERES = 1e-6;

  /** Reverse voltage from which a diode is said to be reversed. */
  private static final double REVERSED_VOLTS = 0.1;

  private final Map<String, Rest> byPart = new LinkedHashMap<>();

  /** One part over the variations. */
  private record Rest(
      String words,
      List<Double> amperes,
      List<Double> volts,
      List<Double> watts,
      Set<String> remarks) {}

  /** The description with what is wanted here among its figures. */
  static BlockDescription asking(BlockDescription of) {
    List<Check> checks = new ArrayList<>(of.checks());
    for (WiredPart part : of.wiring().parts()) {
      if (isLookedAt(part.device())) {
        checks.add(ask(part.id(), Quantity.DC_AMPERES));
        checks.add(ask(part.id(), Quantity.DISSIPATION_WATTS));
        part.nodes().values().stream()
            .filter(node -> !node.equals(Nodes.GROUND))
            .forEach(node -> checks.add(ask(node, Quantity.DC_VOLTS)));
      }
    }
    return new BlockDescription(of.wiring(), checks, of.curves());
  }

  private static boolean isLookedAt(Device device) {
    return device instanceof Diode
        || device instanceof BipolarTransistor
        || device instanceof FieldEffectTransistor;
  }

  private static Check ask(String place, Quantity quantity) {
    return Check.atMost("at-rest", Severity.NOTE, atRest(place, quantity), 0, "asked for a look");
  }

  private static FigureName atRest(String place, Quantity quantity) {
    return new FigureName(place, quantity, CaseName.NO_SIGNAL);
  }

  /**
   * Looks at a solved variation.
   *
   * @param figure gives a figure by its local name
   */
  void add(BlockDescription description, ToDoubleFunction<FigureName> figure) {
    for (WiredPart part : description.wiring().parts()) {
      if (isLookedAt(part.device())) {
        look(part, figure);
      }
    }
  }

  private void look(WiredPart part, ToDoubleFunction<FigureName> figure) {
    double amperes = figure.applyAsDouble(atRest(part.id(), Quantity.DC_AMPERES));
    double watts = figure.applyAsDouble(atRest(part.id(), Quantity.DISSIPATION_WATTS));
    List<Terminal> ends = part.device().terminals();
    double volts =
        volts(part, ends.get(0), figure) - volts(part, ends.get(ends.size() - 1), figure);
    if (Double.isNaN(amperes + watts + volts)) {
      return;
    }
    boolean diode = part.device() instanceof Diode;
    Rest rest =
        byPart.computeIfAbsent(
            part.id(),
            id ->
                new Rest(
                    (diode ? "diode '" : "transistor '") + id + "'",
                    new ArrayList<>(),
                    new ArrayList<>(),
                    new ArrayList<>(),
                    new LinkedHashSet<>()));
    rest.amperes().add(amperes);
    rest.volts().add(volts);
    rest.watts().add(watts);
    if (diode && volts < -REVERSED_VOLTS) {
      rest.remarks()
          .add("REVERSED: right for a clamp or a guard; if it is to conduct, turn it round");
    } else if (part.device() instanceof BipolarTransistor transistor) {
      remark(transistor.model(), amperes, watts, rest.remarks());
    }
  }

  private static double volts(
      WiredPart part, Terminal terminal, ToDoubleFunction<FigureName> figure) {
    String node = part.nodes().get(terminal);
    if (node == null) {
      return Double.NaN;
    }
    return node.equals(Nodes.GROUND) ? 0 : figure.applyAsDouble(atRest(node, Quantity.DC_VOLTS));
  }

  private static void remark(
      TransistorModel model, double amperes, double watts, Set<String> remarks) {
    if (Math.abs(amperes) < LEAST_AMPERES) {
      remarks.add("CARRIES NOTHING: look at its bias");
    } else if (amperes < 0 != model.pnp()) {
      remarks.add("RUNS BACKWARDS: collector and emitter may have changed places");
    }
    double rise = watts * model.junctionToAirKelvinPerWatt();
    if (Math.abs(amperes) > model.mostAmperes() || rise > model.mostJunctionCelsius()) {
      remarks.add(
          "TOO MUCH for "
              + model.name()
              + (", which bears " + Shown.quantity(model.mostAmperes(), Unit.AMPERE))
              + (" and would be " + Shown.quantity(rise, Unit.NUMBER))
              + " K above the air: look at its bias");
    }
  }

  /** A line for each diode and transistor that has a voltage across it. */
  List<String> lines() {
    return byPart.values().stream()
        .filter(rest -> rest.volts().stream().anyMatch(volts -> Math.abs(volts) > 1e-3))
        .map(RestingState::line)
        .toList();
  }

  private static String line(Rest rest) {
    return "at rest: "
        + rest.words()
        + (" " + Shown.range(rest.amperes(), Unit.AMPERE))
        + (", " + Shown.range(rest.volts(), Unit.VOLT))
        + (", " + Shown.range(rest.watts(), Unit.WATT))
        + (rest.remarks().isEmpty() ? "" : "; " + String.join("; ", rest.remarks()));
  }
}
