package earward.study.faults;

import earward.block.quantity.Unit;
import earward.kit.path.Assembly;
import earward.study.limits.Meter;
import java.util.List;

/**
 * How far a reading may lie from its prediction, as a standard deviation: the spread of healthy
 * kits in proportion, and the meter's own error. Immutable.
 *
 * @param readings the readings
 * @param relative of each, the deviation of kits as a share of the reading
 * @param meter on which they are read
 */
public record ReadingError(List<FaultReading> readings, List<Double> relative, Meter meter) {
  /** Error of an ohmmeter and of an ammeter, as a share (common practice). */
  private static final double OTHER_SHARE = 0.03;

  private static final double LEAST_OHMS = 2;
  private static final double LEAST_AMPERES = 2e-4;

  /** From here on a display says "over range". */
  public static final double MOST_OHMS = 2e6;

  public ReadingError {
    readings = List.copyOf(readings);
    relative = List.copyOf(relative);
  }

  /** Of a guide's readings on the first instrument of the kit's bench. */
  public static ReadingError of(FaultGuide guide, Assembly assembly) {
    return new ReadingError(guide.readings(), guide.deviations(), FaultStudy.meter(assembly));
  }

  /**
   * Standard deviation of a reading about its prediction.
   *
   * @param reading its place in the list
   * @param value predicted
   */
  public double deviation(int reading, double value) {
    return Math.hypot(relative.get(reading) * Math.abs(value), meterError(reading, value));
  }

  /** By how much the meter may be wrong at a value. */
  public double meterError(int reading, double value) {
    Unit unit = readings.get(reading).unit();
    return unit == Unit.VOLT
        ? meter.errorVolts(value)
        : OTHER_SHARE * Math.abs(value) + (unit == Unit.OHM ? LEAST_OHMS : LEAST_AMPERES);
  }

  /** How many standard deviations two predictions lie apart; 0 where one does not exist. */
  public double apart(int reading, double one, double other) {
    if (Double.isNaN(one) || Double.isNaN(other)) {
      return 0;
    }
    double width = Math.hypot(deviation(reading, one), deviation(reading, other));
    return Math.abs(one - other) / width;
  }
}
