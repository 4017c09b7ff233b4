package earward.engine.internal;

import earward.block.figure.FigureName;
import earward.engine.Circuit;
import earward.engine.Drive;
import earward.engine.SolveCase;
import java.util.ArrayList;
import java.util.List;

/** A compiled circuit: network, cases, and how each wanted figure is read. Immutable; shared. */
public final class Plan {
  /** Share of the feed's level at a diode above which the carrier drives it. */
  private static final double DRIVEN_SHARE = 0.02;

  /** Carrier at a diode, peak, below which nothing is rectified that a meter could see. */
  private static final double DRIVEN_VOLTS = 1e-3;

  final Network network;
  final List<CasePlan> cases = new ArrayList<>();
  final int[] caseOf;
  final Reading[] readings;

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
    for (int i = 0; i < readings.length; i++) {
      caseOf[i] = caseIndex(wanted.get(i));
      readings[i] = all.of(wanted.get(i), cases.get(caseOf[i]));
    }
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
   * Finds by figures which diodes the carrier drives: with none of them conducting, a share of the
   * feed's carrier stands across each; in any case of a signal it must be worth detecting.
   */
  private List<String> driven(Circuit circuit, Slots slots) {
    List<String> diodes = NetworkBuilder.diodesOf(circuit);
    Network trial = new NetworkBuilder(circuit, slots, diodes).build();
    if (trial.feed == null || diodes.isEmpty()) {
      return List.of();
    }
    boolean[] found = new boolean[diodes.size()];
    for (CasePlan each : cases) {
      if (each.drive == Drive.SIGNAL) {
        CaseWork work = new CaseWork(trial, each);
        work.begin(slots.all().stream().mapToDouble(s -> s.nominal()).toArray());
        mark(work, found);
      }
    }
    List<String> driven = new ArrayList<>();
    for (int i = 0; i < found.length; i++) {
      if (found[i]) {
        driven.add(diodes.get(i));
      }
    }
    return driven;
  }

  private static void mark(CaseWork work, boolean[] found) {
    double[] shares = work.carrierShares();
    for (int i = 0; i < shares.length; i++) {
      found[i] |= shares[i] > DRIVEN_SHARE && shares[i] * work.peakVolts() > DRIVEN_VOLTS;
    }
  }
}
