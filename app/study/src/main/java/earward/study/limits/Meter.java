package earward.study.limits;

import earward.kit.design.Bench.AudioRange;
import earward.kit.design.Bench.Instrument;
import java.util.Optional;

/**
 * How an instrument reads: what it loads the circuit with, its steps, its errors, what it cannot
 * read. Immutable.
 *
 * <p>A digital one stands on the lowest range that holds the voltage and errs by its share of the
 * reading and two steps; an analogue one errs by its share of full scale and is read to half a
 * division of fifty (common practice).
 */
public final class Meter {
  /** An average-responding meter shows this times the mean of the rectified wave: π/(2√2). */
  public static final double SINE_FORM_FACTOR = Math.PI / (2 * Math.sqrt(2));

  private static final int DIGITS_OFF = 2;

  /** Ranges of a common analogue meter, in V (from memory). */
  private static final double[] NEEDLE_RANGES = {2.5, 10, 50, 250, 1000};

  private static final double HALF_DIVISION = 0.01;

  /** Lowest range of a digital meter, in V. */
  private static final double LEAST_RANGE = 0.2;

  private static final double MOST_RANGE = 1e4;

  /** Steps of a reading below which it tells nothing. */
  private static final int LEAST_STEPS = 10;

  private final Instrument instrument;

  /** A meter of these data. */
  public Meter(Instrument instrument) {
    this.instrument = instrument;
  }

  /** Its data. */
  public Instrument instrument() {
    return instrument;
  }

  /**
   * Full scale of the range for a voltage, in V.
   *
   * @param volts of either sign
   */
  public double rangeVolts(double volts) {
    if (instrument.analogue()) {
      for (double range : NEEDLE_RANGES) {
        if (Math.abs(volts) <= range) {
          return range;
        }
      }
      return NEEDLE_RANGES[NEEDLE_RANGES.length - 1];
    }
    double range = LEAST_RANGE * instrument.counts() / Instrument.USUAL_COUNTS;
    while (Math.abs(volts) >= range && range < MOST_RANGE) {
      range *= 10;
    }
    return range;
  }

  /** What it loads the circuit with on that range, in Ω. */
  public double inputOhms(double volts) {
    return instrument.analogue()
        ? instrument.inputOhms() * rangeVolts(volts)
        : instrument.inputOhms();
  }

  /** Smallest difference that it shows, or that an eye reads off it, in V. */
  public double stepVolts(double volts) {
    return instrument.analogue()
        ? HALF_DIVISION * rangeVolts(volts)
        : rangeVolts(volts) / instrument.counts();
  }

  /** By how much a DC reading may be wrong, in V. */
  public double errorVolts(double volts) {
    return instrument.analogue()
        ? instrument.accuracyFraction() * rangeVolts(volts) + stepVolts(volts)
        : instrument.accuracyFraction() * Math.abs(volts) + DIGITS_OFF * stepVolts(volts);
  }

  /**
   * What it reads of a voltage behind a resistance: V·Rin/(Rin + R).
   *
   * @param volts without the meter
   * @param sourceOhms resistance seen from the point
   */
  public double reading(double volts, double sourceOhms) {
    double input = inputOhms(volts);
    return volts * input / (input + sourceOhms);
  }

  /** The next lower value that it can show. */
  public double floor(double volts) {
    double step = stepVolts(volts);
    return Math.floor(volts / step + 1e-9) * step;
  }

  /** The next higher value that it can show. */
  public double ceiling(double volts) {
    double step = stepVolts(volts);
    return Math.ceil(volts / step - 1e-9) * step;
  }

  /**
   * Why it cannot read an audio voltage; empty where it can.
   *
   * @param hertz frequency
   * @param rmsVolts least that is to be read
   */
  public Optional<AudioTrouble> audioTrouble(double hertz, double rmsVolts) {
    Optional<AudioRange> audio = instrument.audio();
    if (audio.isEmpty()) {
      return Optional.of(AudioTrouble.NO_AUDIO);
    }
    if (hertz < audio.get().lowHertz() || hertz > audio.get().highHertz()) {
      return Optional.of(AudioTrouble.OUT_OF_BAND);
    }
    return rmsVolts < LEAST_STEPS * audio.get().stepVolts()
        ? Optional.of(AudioTrouble.TOO_SMALL)
        : Optional.empty();
  }

  /**
   * By how much its audio reading may differ from the fundamental's rms: accuracy, two steps, and
   * what harmonics add: of a true-rms meter √(1 + d²) − 1, of one that responds to the mean at most
   * d/3 (third harmonic in the worst phase: mean of the rectified wave, from memory).
   *
   * @param rmsVolts of the fundamental
   * @param distortion harmonics over the fundamental
   */
  public double audioErrorVolts(double rmsVolts, double distortion) {
    AudioRange audio = instrument.audio().orElseThrow();
    double shape = audio.trueRms() ? Math.sqrt(1 + distortion * distortion) - 1 : distortion / 3;
    return rmsVolts * (audio.accuracyFraction() + shape) + DIGITS_OFF * audio.stepVolts();
  }

  /**
   * What it shows of a wave without DC, given over one period at even steps.
   *
   * @param volts samples
   * @throws IllegalStateException where the instrument reads no audio
   */
  public double audioReading(double[] volts) {
    boolean trueRms = instrument.audio().orElseThrow(IllegalStateException::new).trueRms();
    double sum = 0;
    for (double each : volts) {
      sum += trueRms ? each * each : Math.abs(each);
    }
    double mean = sum / volts.length;
    return trueRms ? Math.sqrt(mean) : SINE_FORM_FACTOR * mean;
  }
}
