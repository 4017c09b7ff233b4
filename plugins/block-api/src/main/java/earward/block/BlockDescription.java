package earward.block;

import earward.block.check.Check;
import earward.block.wiring.Wiring;
import java.util.List;
import java.util.Objects;

/**
 * All that a block says of itself for given settings: its parts in their places, what must hold,
 * and what is worth plotting. Data only; nothing of the plug-in runs when it is used.
 *
 * @param wiring the parts
 * @param checks what must hold
 * @param curves what is worth plotting
 */
public record BlockDescription(Wiring wiring, List<Check> checks, List<Curve> curves) {
  public BlockDescription {
    Objects.requireNonNull(wiring);
    checks = List.copyOf(checks);
    curves = List.copyOf(curves);
  }

  /** A block with checks and no curves. */
  public static BlockDescription of(Wiring wiring, Check... checks) {
    return new BlockDescription(wiring, List.of(checks), List.of());
  }
}
