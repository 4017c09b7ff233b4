package earward.engine.waveform;

import java.util.List;
import java.util.Objects;

/**
 * How a full waveform came out.
 *
 * @param end whether there are figures
 * @param trouble what went wrong, a clause; empty where nothing did
 * @param stepsPerCycle of the last and finest run
 * @param cyclesPerTone carrier cycles in a period of the tone
 * @param toneHertz the tone that was run: the carrier over that number
 * @param steps how many steps were made in all
 * @param stillness largest change of a figure at the last halving of the step, over its limit; at
 *     most 1 where the figures held still
 * @param feedWatts mean power that the feed delivers
 * @param figures place by place
 */
public record WaveformResult(
    End end,
    String trouble,
    int stepsPerCycle,
    int cyclesPerTone,
    double toneHertz,
    long steps,
    double stillness,
    double feedWatts,
    List<WaveformFigures> figures) {
  /** How it ended. */
  public enum End {
    /** Periodic, and the figures held still when the step was halved. */
    SOLVED,
    /** No periodic solution, or no standstill within the finest step. */
    NOT_SOLVED,
    /** The listener ended it. */
    CANCELLED
  }

  public WaveformResult {
    Objects.requireNonNull(end);
    Objects.requireNonNull(trouble);
    figures = List.copyOf(figures);
  }

  /** One without figures. */
  public static WaveformResult without(WaveformTask task, String trouble) {
    double tone = task.carrierHertz() / task.cycles();
    return new WaveformResult(
        End.NOT_SOLVED, trouble, 0, task.cycles(), tone, 0, Double.NaN, Double.NaN, List.of());
  }

  /**
   * The figures of a place.
   *
   * @throws IllegalArgumentException when there are none
   */
  public WaveformFigures at(String place) {
    return figures.stream()
        .filter(each -> each.place().equals(place))
        .findFirst()
        .orElseThrow(() -> new IllegalArgumentException("nothing was measured at " + place));
  }
}
