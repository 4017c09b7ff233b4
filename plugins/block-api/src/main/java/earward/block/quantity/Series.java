package earward.block.quantity;

import java.util.List;

/**
 * The preferred number series of IEC 60063, by which values step.
 *
 * <p>Source: IEC 60063:2015, tables 1 and 2 (lists from memory, compared with the rule: E96 equals
 * round(100·10^(k/96)) for every k, E24 and below do not follow the formula).
 */
public enum Series {
  E6(10, 15, 22, 33, 47, 68),
  E12(10, 12, 15, 18, 22, 27, 33, 39, 47, 56, 68, 82),
  E24(
      10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82,
      91),
  E96(formula(96)),
  /** No series: any value may be had. */
  ANY();

  @SuppressWarnings("ImmutableEnumChecker") // List.of cannot be changed
  private final List<Integer> members;

  Series(Integer... members) {
    this.members = List.of(members);
  }

  private static Integer[] formula(int count) {
    Integer[] members = new Integer[count];
    for (int k = 0; k < count; k++) {
      members[k] = (int) Math.round(100 * Math.pow(10, k / (double) count));
    }
    return members;
  }

  /** One decade of the series: two-digit members (three-digit ones in E96); empty for ANY. */
  public List<Integer> members() {
    return members;
  }

  /**
   * The member nearest to the value by ratio (the geometric nearest), or the value itself for ANY.
   *
   * @param value above 0, in any unit
   * @throws IllegalArgumentException when the value is not a positive number
   */
  public double nearest(double value) {
    if (members.isEmpty()) {
      return requirePositive(value);
    }
    double below = atOrBelow(value);
    double above = next(below);
    return value / below <= above / value ? below : above;
  }

  /** The next member above the value; for ANY the value plus a tenth. */
  public double next(double value) {
    requirePositive(value);
    if (members.isEmpty()) {
      return value * 1.1;
    }
    double low = atOrBelow(value);
    int exponent = exponentOf(low);
    int index = indexOf(low, exponent);
    return index + 1 < members.size() ? member(index + 1, exponent) : member(0, exponent + 1);
  }

  /** The next member below the value; for ANY the value less a tenth. */
  public double previous(double value) {
    requirePositive(value);
    if (members.isEmpty()) {
      return value * 0.9;
    }
    double low = atOrBelow(value);
    if (low < value * (1 - 1e-9)) {
      return low;
    }
    int exponent = exponentOf(low);
    int index = indexOf(low, exponent);
    return index > 0 ? member(index - 1, exponent) : member(members.size() - 1, exponent - 1);
  }

  /** Whether the value is a member, within rounding. */
  public boolean contains(double value) {
    return members.isEmpty() || Math.abs(nearest(value) / value - 1) < 1e-6;
  }

  private double atOrBelow(double value) {
    requirePositive(value);
    int exponent = exponentOf(value);
    double found = member(members.size() - 1, exponent - 1);
    for (int i = 0; i < members.size(); i++) {
      double candidate = member(i, exponent);
      if (candidate <= value * (1 + 1e-9)) {
        found = candidate;
      }
    }
    return found;
  }

  private int indexOf(double member, int exponent) {
    for (int i = 0; i < members.size(); i++) {
      if (Math.abs(member(i, exponent) / member - 1) < 1e-9) {
        return i;
      }
    }
    throw new IllegalStateException("not a member of " + name() + ": " + member);
  }

  /** Dividing by a whole power of ten, rather than multiplying by 0.1, keeps the decimal exact. */
  private double member(int index, int exponent) {
    int shift = exponent - (this == E96 ? 2 : 1);
    double digits = members.get(index);
    return shift >= 0 ? digits * Math.pow(10, shift) : digits / Math.pow(10, -shift);
  }

  private static int exponentOf(double value) {
    return (int) Math.floor(Math.log10(value) + 1e-9);
  }

  private static double requirePositive(double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException("a preferred value is above 0, found " + value);
    }
    return value;
  }
}
