package earward.sheet.content;

import java.util.Objects;

/**
 * How hot one part gets at its worst.
 *
 * @param part reference and type
 * @param atTest dissipation with the test signal
 * @param dissipation at worst
 * @param junction temperature at worst
 * @param limit of the junction temperature
 * @param surface of what a finger can touch
 * @param heatSink its thermal resistance; infinite for none
 */
public record HeatRow(
    String part,
    Amount atTest,
    Amount dissipation,
    Amount junction,
    Amount limit,
    Amount surface,
    Amount heatSink) {
  public HeatRow {
    Objects.requireNonNull(part);
    Objects.requireNonNull(atTest);
    Objects.requireNonNull(dissipation);
    Objects.requireNonNull(junction);
    Objects.requireNonNull(limit);
    Objects.requireNonNull(surface);
    Objects.requireNonNull(heatSink);
  }
}
