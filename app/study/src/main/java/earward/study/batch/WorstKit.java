package earward.study.batch;

import earward.block.figure.FigureName;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * The kit of a batch that comes nearest to failing, or fails worst: its least margin to a limit,
 * counted in standard deviations of that figure, is the least of all.
 *
 * @param number of the kit, from 0
 * @param margin least margin, in standard deviations; negative where a limit is missed
 * @param byCheck code of the check with that margin; empty where a kit could not be solved or no
 *     check applies (then it is the kit farthest from the mean in all readings)
 * @param values its values that differ, by slot
 * @param figures its readings
 */
public record WorstKit(
    long number,
    double margin,
    String byCheck,
    Map<String, Double> values,
    Map<FigureName, Double> figures) {
  public WorstKit {
    values = Collections.unmodifiableMap(new LinkedHashMap<>(values));
    figures = Collections.unmodifiableMap(new LinkedHashMap<>(figures));
  }
}
