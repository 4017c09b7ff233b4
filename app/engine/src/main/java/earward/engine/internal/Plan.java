package earward.engine.internal;

import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.Circuit;
import earward.engine.Drive;
import earward.engine.Slot;
import earward.engine.SolveCase;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** A compiled circuit: network, cases, and how each wanted figure is read. Immutable; shared. */
public final class Plan {
  /** Share of the feed's level at a port above which the carrier drives it. */
  private static final double DRIVEN_SHARE = 0.02;

  /** Carrier at a port, peak, below which nothing is rectified that a meter could see. */
  private static final double DRIVEN_VOLTS = 1e-3;

  /** Figures that the unmodulated carrier suffices for. */
  private static final Set<Quantity> CARRIER_ALONE =
      EnumSet.of(
          Quantity.CLIPPING_DEPTH,
          Quantity.CLIPPING_DEPTH_WITHOUT_CAPACITOR,
          Quantity.CLIPPING_DEPTH_WITHOUT_COUPLING);

  final Network network;
  final List<CasePlan> cases = new ArrayList<>();
  final int[] caseOf;
  final Reading[] readings;

  /** Of each case: whether a figure wants the whole state, not only the bare carrier's. */
  private final boolean[] whole;

  /**
   * Compiles.
   *
   * @throws IllegalArgumentException with one sentence when a wanted figure makes no sense
   */
  public Plan(Circuit circuit, List<SolveCase> solveCases, List<FigureName> wanted) {
    Slots slots = new Slots(circuit, solveCases);
    solveCases.forEach(each -> cases.add(new CasePlan(each, slots)));
    network = new NetworkBuilder(circuit, slots, driven(circuit, slots)).build();
    Readings all = new Readings(network);
    caseOf = new int[wanted.size()];
    readings = new Reading[wanted.size()];
    whole = new boolean[cases.size()];
    for (int i = 0; i < readings.length; i++) {
      caseOf[i] = caseIndex(wanted.get(i));
      readings[i] = all.of(wanted.get(i), cases.get(caseOf[i]));
      if (wanted.get(i).quantity() == Quantity.TEN_PERCENT_WATTS) {
        cases.get(caseOf[i]).addTenPercent();
      }
      whole[caseOf[i]] |= !CARRIER_ALONE.contains(wanted.get(i).quantity());
    }
  }

  /** Whether a figure of a case wants its whole state. */
  boolean wantsWhole(int index) {
    return whole[index];
  }

  private int caseIndex(FigureName name) {
    for (int i = 0; i < cases.size(); i++) {
      if (cases.get(i).name.equals(name.caseName())) {
        return i;
      }
    }
    throw new IllegalArgumentException("there is no case '" + name.caseName() + "' to solve");
  }

  /** The values of a row. */
  public Slots slots() {
    return network.slots();
  }

  /**
   * Finds by figures which parts the carrier drives: with none of them conducting, a share of the
   * feed's carrier stands across a port of each; in some case of a signal it must be worth
   * detecting.
   */
  private List<String> driven(Circuit circuit, Slots slots) {
    List<String> parts = NetworkBuilder.drivable(circuit);
    Network trial = new NetworkBuilder(circuit, slots, parts).build();
    Set<String> found = new HashSet<>();
    if (trial.feed != null && !parts.isEmpty()) {
      double[] values = slots.all().stream().mapToDouble(Slot::nominal).toArray();
      for (CasePlan each : cases) {
        if (each.drive == Drive.SIGNAL && found.size() < parts.size()) {
          CaseWork work = new CaseWork(trial, each, Fineness.USUAL);
          work.begin(values);
          mark(work, found);
        }
      }
    }
    return parts.stream().filter(found::contains).toList();
  }

  private static void mark(CaseWork work, Set<String> found) {
    double[] shares = work.carrierShares();
    for (int i = 0; i < shares.length; i++) {
      if (shares[i] > DRIVEN_SHARE && shares[i] * work.peakVolts() > DRIVEN_VOLTS) {
        found.add(work.network.ports[i].part());
      }
    }
  }
}
