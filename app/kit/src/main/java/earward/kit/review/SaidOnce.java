package earward.kit.review;

import earward.block.check.Finding;
import earward.block.check.Finding.Measured;
import earward.block.device.Capacitor;
import earward.block.figure.Quantity;
import earward.engine.CircuitPart;
import earward.kit.path.Assembly;
import java.util.ArrayList;
import java.util.List;

/** Leaves out of a review what says again, of the same figure or the same part, what was said. */
final class SaidOnce {
  /** Two figures this close are one and the same edge, seen at two places of the path. */
  private static final double SAME = 1e-6;

  private final Assembly assembly;

  private SaidOnce(Assembly assembly) {
    this.assembly = assembly;
  }

  static List<Finding> of(List<Finding> findings, Assembly assembly) {
    SaidOnce once = new SaidOnce(assembly);
    List<Finding> kept = new ArrayList<>();
    for (Finding finding : findings) {
      int at = once.indexOfSame(kept, finding);
      if (at < 0) {
        kept.add(finding);
      } else if (once.outweighs(finding, kept.get(at))) {
        kept.set(at, finding);
      }
    }
    return kept;
  }

  private int indexOfSame(List<Finding> kept, Finding finding) {
    for (int i = 0; i < kept.size(); i++) {
      if (same(kept.get(i), finding)) {
        return i;
      }
    }
    return -1;
  }

  private boolean same(Finding earlier, Finding later) {
    if (earlier.measured().isEmpty() || later.measured().isEmpty()) {
      return false;
    }
    Measured one = earlier.measured().get();
    Measured other = later.measured().get();
    return sameEdge(one, other)
        || (ofOneMatter(earlier, later) && one.figure().place().equals(other.figure().place()))
        || reversedAlready(one, other);
  }

  /** One code in several cases, or output short at the end of a battery that is short when new. */
  private static boolean ofOneMatter(Finding earlier, Finding later) {
    return earlier.subject().equals(later.subject())
        && (earlier.code().equals(later.code())
            || (earlier.code().equals("little-output")
                && later.code().equals("little-output-at-end")));
  }

  /** The worse of two cases of one code is the one that is said. */
  private boolean outweighs(Finding later, Finding kept) {
    return later.code().equals(kept.code())
        && later.measured().isPresent()
        && kept.measured().isPresent()
        && beyond(later.measured().get()) > beyond(kept.measured().get())
        && !isEdge(later.measured().get());
  }

  private static double beyond(Measured measured) {
    return Math.abs(measured.value() - measured.limit());
  }

  private static boolean isEdge(Measured measured) {
    Quantity quantity = measured.figure().quantity();
    return quantity == Quantity.LOW_EDGE_HERTZ || quantity == Quantity.HIGH_EDGE_HERTZ;
  }

  /** The same edge seen again further along the path, and at its end, is one finding. */
  private static boolean sameEdge(Measured one, Measured other) {
    return isEdge(one)
        && one.figure().quantity() == other.figure().quantity()
        && one.figure().caseName().equals(other.figure().caseName())
        && Math.abs(one.value() - other.value()) <= SAME * Math.abs(one.value());
  }

  /** A block that found its own line the wrong way round has said so of the capacitor on it. */
  private boolean reversedAlready(Measured one, Measured other) {
    return one.figure().quantity() == Quantity.DC_VOLTS
        && other.figure().quantity() == Quantity.DROP_VOLTS
        && assembly.circuit().parts().stream()
            .filter(part -> part.name().equals(other.figure().place()))
            .anyMatch(part -> hangsOn(part, one.figure().place()));
  }

  private static boolean hangsOn(CircuitPart part, String node) {
    return part.device() instanceof Capacitor && part.nodes().containsValue(node);
  }
}
