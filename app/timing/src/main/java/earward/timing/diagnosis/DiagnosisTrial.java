package earward.timing.diagnosis;

import earward.block.quantity.Unit;
import earward.kit.path.Assembly;
import earward.study.batch.Habits;
import earward.study.diagnosis.Diagnosis;
import earward.study.diagnosis.Diagnostician;
import earward.study.diagnosis.Evidence;
import earward.study.diagnosis.RankedGroup;
import earward.study.faults.Fault;
import earward.study.faults.FaultGroup;
import earward.study.faults.FaultGuide;
import earward.study.faults.FaultReading;
import earward.study.faults.FaultSigns;
import earward.study.faults.FaultSolver;
import earward.study.faults.ReadingError;
import earward.study.faults.Signs;
import earward.study.faults.Tone;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SplittableRandom;

/**
 * Kits with known faults, diagnosed from at most eight readings. Faults that leave a trace are
 * drawn evenly over the parts; groups are those of the guide, fixed beforehand.
 */
final class DiagnosisTrial {
  private static final int MOST_READINGS = 8;
  private static final double HEALTHY_SHARE = 0.25;
  private static final double DOUBLE_SHARE = 0.1;
  private static final double SLIP_SHARE = 0.05;

  private final FaultSolver solver;
  private final FaultGuide guide;
  private final ReadingError error;
  private final Diagnostician diagnostician;
  private final Map<String, List<Fault>> byPart = new LinkedHashMap<>();
  private final Map<String, Integer> groupOf = new HashMap<>();
  private final ThreadLocal<FaultSolver.OneThread> threads;

  DiagnosisTrial(Assembly assembly, FaultSolver solver, FaultGuide guide) {
    this.solver = solver;
    this.guide = guide;
    error = ReadingError.of(guide, assembly);
    diagnostician = new Diagnostician(guide, error);
    threads = ThreadLocal.withInitial(solver::oneThread);
    for (FaultGroup group : guide.groups()) {
      for (FaultSigns each : group.faults()) {
        groupOf.put(each.fault().id(), group.number());
        byPart
            .computeIfAbsent(each.fault().parts().get(0), part -> new ArrayList<>())
            .add(each.fault());
      }
    }
  }

  static FaultSolver solver(Assembly assembly) {
    return new FaultSolver(assembly, Habits.USUAL);
  }

  Outcome trial(long seed, int number) {
    SplittableRandom random = new SplittableRandom(seed * 1_000_003 + number);
    List<Fault> faults = faults(random);
    double[] values = solver.draw().nominal();
    solver.draw().draw(seed + 77, number, values);
    OtherParts.factors(solver.assembly().circuit().parts(), random)
        .forEach((slot, factor) -> values[solver.slot(slot)] *= factor);
    Signs signs = threads.get().signs(values, faults.stream().map(Fault::values).toList());
    Evidence evidence = Evidence.NONE;
    Diagnosis diagnosis = diagnostician.of(evidence, reading -> !reading.needsSignal());
    while (evidence.size() < MOST_READINGS && diagnosis.next().isPresent()) {
      evidence = taken(evidence, diagnosis.next().get(), signs, random);
      diagnosis = diagnostician.of(evidence, reading -> !reading.needsSignal());
    }
    return outcome(faults, diagnosis, evidence);
  }

  private List<Fault> faults(SplittableRandom random) {
    if (random.nextDouble() < HEALTHY_SHARE) {
      return List.of();
    }
    List<Fault> faults = new ArrayList<>(List.of(fault(random)));
    if (random.nextDouble() < DOUBLE_SHARE) {
      faults.add(fault(random));
    }
    return faults;
  }

  private Fault fault(SplittableRandom random) {
    List<String> parts = List.copyOf(byPart.keySet());
    List<Fault> faults = byPart.getOrDefault(parts.get(random.nextInt(parts.size())), List.of());
    return faults.get(random.nextInt(faults.size()));
  }

  private Evidence taken(Evidence evidence, String key, Signs signs, SplittableRandom random) {
    boolean slip = random.nextDouble() < SLIP_SHARE;
    if (key.equals(FaultReading.TONE)) {
      Tone[] tones = Tone.values();
      return evidence.with(slip ? tones[random.nextInt(tones.length)] : signs.tone());
    }
    if (key.equals(FaultReading.HEAT)) {
      return evidence.withHeat(slip != signs.hot());
    }
    int index = guide.readings().stream().map(FaultReading::key).toList().indexOf(key);
    double value = signs.readings().get(index);
    if (Double.isNaN(value)) {
      value = 0; // what has no solution reads as nothing
    }
    double read = value + error.meterError(index, value) / 2 * random.nextGaussian();
    return evidence.with(key, slip ? slipped(index, signs, random) : ofScale(index, read));
  }

  /** A decimal point in the wrong place, or the reading of a neighbouring point. */
  private double slipped(int index, Signs signs, SplittableRandom random) {
    double value = signs.readings().get(index);
    if (random.nextBoolean()) {
      return ofScale(index, random.nextBoolean() ? 10 * value : value / 10);
    }
    for (int other = index + 1; other < guide.readings().size(); other++) {
      if (guide.readings().get(other).unit() == guide.readings().get(index).unit()) {
        double neighbour = signs.readings().get(other);
        return Double.isNaN(neighbour) ? 0 : neighbour;
      }
    }
    return 10 * value;
  }

  private double ofScale(int index, double value) {
    return guide.readings().get(index).unit() == Unit.OHM
        ? Math.max(0, Math.min(ReadingError.MOST_OHMS, value))
        : value;
  }

  private Outcome outcome(List<Fault> faults, Diagnosis diagnosis, Evidence evidence) {
    List<Integer> truth = faults.stream().map(f -> groupOf.getOrDefault(f.id(), 0)).toList();
    int place = 0;
    for (int i = 0; i < diagnosis.ranked().size() && place == 0; i++) {
      int number = number(diagnosis.ranked().get(i));
      if (truth.isEmpty() ? number == 0 : truth.contains(number)) {
        place = i + 1;
      }
    }
    return new Outcome(truth, number(diagnosis.ranked().get(0)), place, evidence.size());
  }

  private static int number(RankedGroup ranked) {
    Optional<FaultGroup> group = ranked.group();
    return group.map(FaultGroup::number).orElse(0);
  }
}
