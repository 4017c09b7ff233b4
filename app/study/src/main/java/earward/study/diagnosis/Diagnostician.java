package earward.study.diagnosis;

import earward.study.faults.FaultGroup;
import earward.study.faults.FaultGuide;
import earward.study.faults.FaultReading;
import earward.study.faults.FaultSigns;
import earward.study.faults.ReadingError;
import earward.study.faults.Signs;
import earward.study.faults.Tone;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;

/**
 * Ranks groups of faults by Bayes' rule: prior times the likelihood of readings and observations. A
 * reading is off by its kits' spread and its meter, or a slip of the pen anywhere in its range.
 * Immutable.
 */
public final class Diagnostician {
  /**
   * Probability that a kit at hand has no fault or one that cannot be seen (judgement): high, so
   * that one slip of the pen does not make a sound kit faulty.
   */
  private static final double HEALTHY_PRIOR = 0.9;

  /** Share of readings that are slips (judgement). */
  private static final double SLIP = 0.05;

  /** Share of observations that are mistaken (judgement). */
  private static final double MISHEARD = 0.1;

  /** A reading farther off its prediction does not agree, in standard deviations. */
  private static final double MISFIT = 3;

  /** A reading that tells less than this is not worth taking, in nats. */
  private static final double LEAST_TOLD = 0.001;

  private static final int GROUPS_LOOKED_AT = 40;

  /** A reading taken again guards against a slip; a third time tells nothing. */
  private static final int MOST_TIMES = 2;

  private final FaultGuide guide;
  private final ReadingError error;
  private final double[] spans;

  private record Candidate(Optional<FaultGroup> group, double prior, List<FaultSigns> faults) {}

  /**
   * A diagnostician for one kit.
   *
   * @param guide its fault guide
   * @param error how far readings lie from their predictions
   */
  public Diagnostician(FaultGuide guide, ReadingError error) {
    this.guide = guide;
    this.error = error;
    spans = new double[guide.readings().size()];
    for (int i = 0; i < spans.length; i++) {
      double least = guide.healthy().readings().get(i);
      double most = least;
      for (FaultGroup group : guide.groups()) {
        double value = group.signs().readings().get(i);
        least = Double.isNaN(value) ? least : Math.min(least, value);
        most = Double.isNaN(value) ? most : Math.max(most, value);
      }
      spans[i] = Math.max(most - least, 10 * error.deviation(i, most));
    }
  }

  /** What the evidence says; readings are proposed from all of the guide's. */
  public Diagnosis of(Evidence evidence) {
    return of(evidence, reading -> true);
  }

  /**
   * What the evidence says.
   *
   * @param can which readings the builder can take
   */
  public Diagnosis of(Evidence evidence, Predicate<FaultReading> can) {
    List<RankedGroup> ranked = ranked(evidence);
    return new Diagnosis(ranked, next(evidence, ranked, can));
  }

  private List<RankedGroup> ranked(Evidence evidence) {
    List<Candidate> candidates = new ArrayList<>();
    candidates.add(new Candidate(Optional.empty(), HEALTHY_PRIOR, List.of()));
    for (FaultGroup group : guide.groups()) {
      candidates.add(new Candidate(Optional.of(group), group.prior(), group.faults()));
    }
    double[] logs = new double[candidates.size()];
    double most = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < logs.length; i++) {
      logs[i] = logPosterior(candidates.get(i), evidence);
      most = Math.max(most, logs[i]);
    }
    double whole = 0;
    for (double each : logs) {
      whole += Math.exp(each - most);
    }
    List<RankedGroup> ranked = new ArrayList<>();
    for (int i = 0; i < logs.length; i++) {
      Candidate candidate = candidates.get(i);
      List<String> misfits = misfits(signs(candidate.group()), evidence);
      ranked.add(
          new RankedGroup(
              candidate.group(),
              Math.exp(logs[i] - most) / whole,
              evidence.size() - misfits.size(),
              misfits));
    }
    ranked.sort(Comparator.comparingDouble(RankedGroup::probability).reversed());
    return ranked;
  }

  private Signs signs(Optional<FaultGroup> group) {
    return group.map(FaultGroup::signs).orElse(guide.healthy());
  }

  /** Of a group the sum over its faults, each with its own signs. */
  private double logPosterior(Candidate candidate, Evidence evidence) {
    if (candidate.group().isEmpty()) {
      return Math.log(candidate.prior()) + logLikelihood(guide.healthy(), evidence);
    }
    double most = Double.NEGATIVE_INFINITY;
    List<Double> logs = new ArrayList<>();
    for (FaultSigns each : candidate.faults()) {
      double log =
          Math.log((1 - HEALTHY_PRIOR) * each.fault().prior())
              + logLikelihood(each.signs(), evidence);
      logs.add(log);
      most = Math.max(most, log);
    }
    double sum = 0;
    for (double log : logs) {
      sum += Math.exp(log - most);
    }
    return most + Math.log(sum);
  }

  private double logLikelihood(Signs signs, Evidence evidence) {
    double log = 0;
    for (int i = 0; i < spans.length; i++) {
      List<Double> values =
          evidence.readings().getOrDefault(guide.readings().get(i).key(), List.of());
      if (!values.isEmpty()) {
        log += Math.log(likelihood(i, values, signs.readings().get(i)));
      }
    }
    for (Tone tone : evidence.tones()) {
      boolean same = tone == signs.tone();
      log += Math.log(same ? 1 - MISHEARD : MISHEARD / (Tone.values().length - 1));
    }
    for (boolean hot : evidence.heats()) {
      log += Math.log(hot == signs.hot() ? 1 - MISHEARD : MISHEARD);
    }
    return log;
  }

  /**
   * Of a reading that was taken once or again. Two that agree within the meter are both right, or
   * the same slip twice; of two that differ one is a slip, or both.
   */
  private double likelihood(int reading, List<Double> values, double predicted) {
    double first = values.get(0);
    double anywhere = SLIP / spans[reading];
    if (values.size() == 1) {
      return (1 - SLIP) * bell(reading, first, predicted) + anywhere;
    }
    double again = values.get(1);
    double onTheMeter = Math.max(1e-12, error.meterError(reading, first));
    boolean agree = Math.abs(first - again) <= MISFIT * onTheMeter;
    double both =
        agree
            ? (1 - SLIP) * (1 - SLIP) * bell(reading, (first + again) / 2, predicted) / onTheMeter
            : 0;
    double one =
        (1 - SLIP) * anywhere * (bell(reading, first, predicted) + bell(reading, again, predicted));
    return both + one + anywhere * anywhere;
  }

  private double bell(int reading, double value, double predicted) {
    if (Double.isNaN(predicted)) {
      return 1 / spans[reading];
    }
    double deviation = error.deviation(reading, predicted);
    double off = (value - predicted) / deviation;
    return Math.exp(-off * off / 2) / (deviation * Math.sqrt(2 * Math.PI));
  }

  private List<String> misfits(Signs signs, Evidence evidence) {
    List<String> misfits = new ArrayList<>();
    evidence
        .readings()
        .forEach(
            (key, values) -> {
              int reading = index(key);
              double predicted = reading < 0 ? Double.NaN : signs.readings().get(reading);
              for (double value : values) {
                if (!Double.isNaN(predicted)
                    && Math.abs(value - predicted) > MISFIT * error.deviation(reading, predicted)) {
                  misfits.add(key);
                }
              }
            });
    for (Tone tone : evidence.tones()) {
      if (tone != signs.tone()) {
        misfits.add(FaultReading.TONE);
      }
    }
    for (boolean hot : evidence.heats()) {
      if (hot != signs.hot()) {
        misfits.add(FaultReading.HEAT);
      }
    }
    return misfits;
  }

  private int index(String key) {
    for (int i = 0; i < guide.readings().size(); i++) {
      if (guide.readings().get(i).key().equals(key)) {
        return i;
      }
    }
    return -1;
  }

  /**
   * The reading after which the least doubt is left: −Σ p·ln Σ p′·K over the groups, K the overlap
   * of two predictions (1: alike; 0: told apart).
   */
  private Optional<String> next(
      Evidence evidence, List<RankedGroup> ranked, Predicate<FaultReading> can) {
    List<RankedGroup> looked = ranked.subList(0, Math.min(GROUPS_LOOKED_AT, ranked.size()));
    double best = LEAST_TOLD;
    Optional<String> next = Optional.empty();
    for (int i = 0; i < spans.length; i++) {
      FaultReading reading = guide.readings().get(i);
      if (can.test(reading) && evidence.times(reading.key()) < MOST_TIMES) {
        int column = i;
        double told = told(looked, (one, other) -> overlap(column, one, other));
        if (told > best) {
          best = told;
          next = Optional.of(reading.key());
        }
      }
    }
    if (evidence.tones().size() < MOST_TIMES) {
      double told = told(looked, (one, other) -> one.tone() == other.tone() ? 1 : MISHEARD);
      if (told > best) {
        best = told;
        next = Optional.of(FaultReading.TONE);
      }
    }
    if (evidence.heats().size() < MOST_TIMES
        && told(looked, (one, other) -> one.hot() == other.hot() ? 1 : MISHEARD) > best) {
      next = Optional.of(FaultReading.HEAT);
    }
    return next;
  }

  @FunctionalInterface
  private interface Overlap {
    double of(Signs one, Signs other);
  }

  private double told(List<RankedGroup> looked, Overlap overlap) {
    double told = 0;
    for (RankedGroup one : looked) {
      double alike = 0;
      for (RankedGroup other : looked) {
        alike += other.probability() * overlap.of(signs(one.group()), signs(other.group()));
      }
      told -= one.probability() * Math.log(Math.max(1e-12, alike));
    }
    return told;
  }

  private double overlap(int reading, Signs one, Signs other) {
    double apart = error.apart(reading, one.readings().get(reading), other.readings().get(reading));
    return Math.max(SLIP, Math.exp(-apart * apart / 4));
  }
}
