package earward.engine.internal;

import earward.block.figure.CaseName;
import earward.engine.Drive;
import earward.engine.SolveCase;
import java.util.ArrayList;
import java.util.List;

/** A case with its overrides as indices of slots. Immutable; the arrays are not to be written. */
final class CasePlan {
  final CaseName name;
  final Drive drive;
  private final int[] slots;
  private final double[] values;
  private boolean tenPercent;
  private final List<int[]> noise = new ArrayList<>();

  CasePlan(SolveCase from, Slots all) {
    name = from.name();
    drive = from.drive();
    slots = from.overrides().keySet().stream().sorted().mapToInt(all::of).toArray();
    values =
        from.overrides().entrySet().stream()
            .sorted(java.util.Map.Entry.comparingByKey())
            .mapToDouble(java.util.Map.Entry::getValue)
            .toArray();
  }

  /** Notes that the power at 10 % distortion is wanted; only while the plan is made. */
  void addTenPercent() {
    tenPercent = true;
  }

  /** Whether the power at 10 % distortion is wanted. */
  boolean tenPercent() {
    return tenPercent;
  }

  /** Adds a place where noise is wanted; only while the plan is made. */
  int addNoise(int plus, int minus) {
    for (int i = 0; i < noise.size(); i++) {
      if (noise.get(i)[0] == plus && noise.get(i)[1] == minus) {
        return i;
      }
    }
    noise.add(new int[] {plus, minus});
    return noise.size() - 1;
  }

  /** One node of each place where noise is wanted. */
  int[] noisePlus() {
    return noise.stream().mapToInt(place -> place[0]).toArray();
  }

  /** The other node of each place where noise is wanted. */
  int[] noiseMinus() {
    return noise.stream().mapToInt(place -> place[1]).toArray();
  }

  /** The row of this case. */
  void apply(double[] row, double[] into) {
    System.arraycopy(row, 0, into, 0, row.length);
    for (int i = 0; i < slots.length; i++) {
      into[slots[i]] = values[i];
    }
  }
}
