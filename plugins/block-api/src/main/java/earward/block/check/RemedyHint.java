package earward.block.check;

import java.util.Objects;

/**
 * Where a block's author would turn when a check fails: a setting of the block and a direction. The
 * host walks the preferred series from there, solves, and offers only what it has proven.
 *
 * @param settingId a setting of the same block
 * @param direction which way to walk
 */
public record RemedyHint(String settingId, Direction direction) {

  public RemedyHint {
    Objects.requireNonNull(direction);
    if (settingId.isBlank()) {
      throw new IllegalArgumentException("a remedy names no setting; wanted one of the block's");
    }
  }

  /** Which way the host walks. */
  public enum Direction {
    UP,
    DOWN,
    /** Try the other options of a choice. */
    OTHER
  }

  /** Raise the setting. */
  public static RemedyHint raise(String settingId) {
    return new RemedyHint(settingId, Direction.UP);
  }

  /** Lower the setting. */
  public static RemedyHint lower(String settingId) {
    return new RemedyHint(settingId, Direction.DOWN);
  }

  /** Try the other options. */
  public static RemedyHint change(String settingId) {
    return new RemedyHint(settingId, Direction.OTHER);
  }
}
