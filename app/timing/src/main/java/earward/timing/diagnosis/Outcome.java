package earward.timing.diagnosis;

import java.util.List;

/**
 * One trial.
 *
 * @param truth numbers of the groups of its faults; empty for a healthy kit
 * @param called number of the group that was ranked first, 0 for healthy
 * @param place place of a right group, from 1; 0 where it is not among the ranked
 * @param readings how many readings and observations were taken
 */
record Outcome(List<Integer> truth, int called, int place, int readings) {
  boolean healthy() {
    return truth.isEmpty();
  }

  boolean first() {
    return place == 1;
  }

  boolean amongThree() {
    return place >= 1 && place <= 3;
  }
}
