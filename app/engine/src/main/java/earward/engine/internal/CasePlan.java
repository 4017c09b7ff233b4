package earward.engine.internal;

import earward.block.figure.CaseName;
import earward.engine.Drive;
import earward.engine.SolveCase;

/** A case with its overrides as indices of slots. Immutable; the arrays are not to be written. */
final class CasePlan {
  final CaseName name;
  final Drive drive;
  private final int[] slots;
  private final double[] values;

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

  /** The row of this case. */
  void apply(double[] row, double[] into) {
    System.arraycopy(row, 0, into, 0, row.length);
    for (int i = 0; i < slots.length; i++) {
      into[slots[i]] = values[i];
    }
  }
}
