package earward.study.batch;

import earward.block.check.Check;
import java.util.Objects;

/**
 * A check as it is held against every kit.
 *
 * @param check with its figure in the whole path
 * @param subject the block's id, or {@code path}
 * @param forYield whether a kit that fails it is not counted as good: a STOP, or a limit that the
 *     conditions want
 */
public record BatchCheck(Check check, String subject, boolean forYield) {
  public BatchCheck {
    Objects.requireNonNull(check);
    Objects.requireNonNull(subject);
  }
}
