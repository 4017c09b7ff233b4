package earward.command;

import earward.block.quantity.Unit;
import earward.kit.path.Assembly;
import earward.study.faults.Fault;
import earward.study.faults.FaultReading;
import java.util.stream.Collectors;

/** Faults and readings in words. */
final class FaultWords {
  /** From here on an ohmmeter shows "over range". */
  private static final double MOST_OHMS = 1.99e6;

  private FaultWords() {}

  /** {@code R3 is open or missing}. */
  static String sentence(Assembly assembly, Fault fault) {
    String parts =
        fault.parts().stream()
            .map(part -> assembly.references().ofPart(part).orElse(part))
            .collect(Collectors.joining(" and "));
    return parts + " " + fault.words();
  }

  static String value(FaultReading reading, double value) {
    if (Double.isNaN(value)) {
      return "not solved";
    }
    if (reading.unit() == Unit.OHM && value >= MOST_OHMS) {
      return "over range";
    }
    boolean nothing = reading.unit() == Unit.VOLT && Math.abs(value) < 1e-4;
    return Shown.quantity(nothing ? 0 : value, reading.unit());
  }
}
