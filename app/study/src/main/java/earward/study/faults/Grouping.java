package earward.study.faults;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Puts faults that look alike into one group: a fault joins the first group whose most probable
 * fault it cannot be told from. Used once.
 */
final class Grouping {
  /** So many standard deviations apart two readings can be told. */
  private static final double TOLD_APART = 3;

  private final List<FaultReading> readings;
  private final Signs healthy;
  private final ReadingError error;

  Grouping(List<FaultReading> readings, Signs healthy, ReadingError error) {
    this.readings = readings;
    this.healthy = healthy;
    this.error = error;
  }

  FaultGuide guide(List<Fault> faults, List<Signs> signs, List<Double> deviations) {
    List<List<FaultSigns>> groups = new ArrayList<>();
    List<FaultSigns> withoutTrace = new ArrayList<>();
    for (int i = 0; i < signs.size(); i++) {
      FaultSigns one = new FaultSigns(faults.get(i), signs.get(i));
      if (tells(one.signs(), healthy).isEmpty()) {
        withoutTrace.add(one);
      } else {
        home(groups, one).add(one);
      }
    }
    List<FaultGroup> numbered = new ArrayList<>();
    groups.sort(Comparator.comparingDouble(group -> -prior(group)));
    for (List<FaultSigns> group : groups) {
      Signs first = group.get(0).signs();
      numbered.add(new FaultGroup(numbered.size() + 1, group, first, tells(first, healthy)));
    }
    return new FaultGuide(readings, healthy, numbered, withoutTrace, signs.size(), deviations);
  }

  private List<FaultSigns> home(List<List<FaultSigns>> groups, FaultSigns one) {
    for (List<FaultSigns> group : groups) {
      if (tells(group.get(0).signs(), one.signs()).isEmpty()) {
        return group;
      }
    }
    List<FaultSigns> fresh = new ArrayList<>();
    groups.add(fresh);
    return fresh;
  }

  private static double prior(List<FaultSigns> group) {
    return group.stream().mapToDouble(each -> each.fault().prior()).sum();
  }

  /** Keys of what tells one kit from another. */
  private List<String> tells(Signs one, Signs other) {
    List<String> tells = new ArrayList<>();
    if (one.tone() != other.tone()) {
      tells.add(FaultReading.TONE);
    }
    if (one.hot() != other.hot()) {
      tells.add(FaultReading.HEAT);
    }
    for (int i = 0; i < readings.size(); i++) {
      if (error.apart(i, one.readings().get(i), other.readings().get(i)) > TOLD_APART) {
        tells.add(readings.get(i).key());
      }
    }
    return tells;
  }
}
