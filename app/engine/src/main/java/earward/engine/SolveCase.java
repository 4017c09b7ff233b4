package earward.engine;

import earward.block.figure.CaseName;
import java.util.Map;
import java.util.Objects;

/**
 * One state in which the circuit is solved.
 *
 * @param name its name
 * @param drive what drives it
 * @param overrides slot name to value; all other slots are as the caller's row says
 */
public record SolveCase(CaseName name, Drive drive, Map<String, Double> overrides) {
  public SolveCase {
    Objects.requireNonNull(name);
    Objects.requireNonNull(drive);
    overrides = Map.copyOf(overrides);
  }
}
