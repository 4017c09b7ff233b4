package earward.engine.law;

/**
 * Where a part sits in the equations: nodes, first slot of its parameters, slots of its faults,
 * first branch. Immutable; the arrays are not to be written.
 */
public final class Seat {
  private final String name;
  private final int[] nodes;
  private final int[] reversed;
  private final int firstSlot;
  private final int openSlot;
  private final int firstBranch;

  /**
   * A seat.
   *
   * @param name name of the part
   * @param nodes node of each terminal in the device's order, −1 for ground
   * @param reversed the same with the part fitted the wrong way round
   * @param firstSlot slot of the first parameter
   * @param openSlot slot of the open fault; short and reversed follow
   * @param firstBranch index of the first branch unknown
   */
  public Seat(
      String name, int[] nodes, int[] reversed, int firstSlot, int openSlot, int firstBranch) {
    this.name = name;
    this.nodes = nodes.clone();
    this.reversed = reversed.clone();
    this.firstSlot = firstSlot;
    this.openSlot = openSlot;
    this.firstBranch = firstBranch;
  }

  public String name() {
    return name;
  }

  int[] nodes() {
    return nodes;
  }

  int[] reversed() {
    return reversed;
  }

  public int firstSlot() {
    return firstSlot;
  }

  public int openSlot() {
    return openSlot;
  }

  public int firstBranch() {
    return firstBranch;
  }
}
