package earward.study.faults;

import earward.block.figure.FigureName;
import earward.block.quantity.Unit;
import java.util.Objects;

/**
 * One reading that a builder may take.
 *
 * @param key by which readings are written down: {@code TP3:no-signal}, {@code TP3:ohms}, {@code
 *     supply:no-signal}
 * @param place test point, or {@code path} for the supply current
 * @param unit V, Ω or A
 * @param figure what is solved for it
 * @param needsSignal whether it wants the test signal or a steady station
 */
public record FaultReading(
    String key, String place, Unit unit, FigureName figure, boolean needsSignal) {
  /** Key of the tone that is heard. */
  public static final String TONE = "tone";

  /** Key of what a finger feels at rest. */
  public static final String HEAT = "heat";

  public FaultReading {
    Objects.requireNonNull(key);
    Objects.requireNonNull(place);
    Objects.requireNonNull(unit);
    Objects.requireNonNull(figure);
  }
}
