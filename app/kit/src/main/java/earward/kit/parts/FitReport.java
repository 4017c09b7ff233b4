package earward.kit.parts;

import java.util.OptionalDouble;

/**
 * How well figures were fitted to data-sheet points.
 *
 * @param points how many points were used
 * @param residualFraction root mean square of the relative misfit; empty where there are too few
 *     points to tell
 * @param lowestAmperes current of the lowest point: below it the figures are extrapolated
 */
public record FitReport(int points, OptionalDouble residualFraction, double lowestAmperes) {}
