package earward.drawing.internal.form;

/** A direction on the paper. */
public enum Side {
  LEFT(0, -1, 0),
  UP(1, 0, -1),
  RIGHT(2, 1, 0),
  DOWN(3, 0, 1);

  private final int number;
  private final int dx;
  private final int dy;

  Side(int number, int dx, int dy) {
    this.number = number;
    this.dx = dx;
    this.dy = dy;
  }

  /** Its place among the four, from 0. */
  public int number() {
    return number;
  }

  /** Step across. */
  public int dx() {
    return dx;
  }

  /** Step down. */
  public int dy() {
    return dy;
  }

  /** Whether it runs across. */
  public boolean across() {
    return dy == 0;
  }

  /** The other way. */
  public Side opposite() {
    return switch (this) {
      case LEFT -> RIGHT;
      case UP -> DOWN;
      case RIGHT -> LEFT;
      case DOWN -> UP;
    };
  }
}
