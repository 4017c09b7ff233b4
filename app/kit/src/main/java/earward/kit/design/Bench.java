package earward.kit.design;

import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * The instruments that a builder of the kit owns.
 *
 * @param instruments in the order in which they are to be used
 * @param written how the file had it
 */
public record Bench(List<Instrument> instruments, AsWritten written) {
  /** One digital meter of 10 MΩ. */
  public static final Bench USUAL =
      new Bench(
          List.of(new Instrument("digital multimeter", 10e6, 0.005, AsWritten.NEW)), AsWritten.NEW);

  /**
   * A meter.
   *
   * @param name what the sheet calls it
   * @param inputOhms what it loads the circuit with on DC, above 0; of an analogue one per volt of
   *     its range
   * @param accuracyFraction of the reading, of an analogue one of full scale; from 0 to below 1
   * @param counts steps of a digital one's display, at least 100; 0 for an analogue one
   * @param audio what it reads of audio; empty: nothing
   * @param written how the file had it
   */
  public record Instrument(
      String name,
      double inputOhms,
      double accuracyFraction,
      int counts,
      Optional<AudioRange> audio,
      AsWritten written) {
    /** Counts of a display of three and a half digits. */
    public static final int USUAL_COUNTS = 2000;

    public Instrument {
      Objects.requireNonNull(audio);
      Objects.requireNonNull(written);
      if (name.isBlank()) {
        throw new IllegalArgumentException("an instrument has no name");
      }
      if (!(inputOhms > 0)) {
        throw new IllegalArgumentException(
            "the input resistance of '" + name + "' is " + inputOhms + " Ω; wanted above 0 Ω");
      }
      if (!(accuracyFraction >= 0 && accuracyFraction < 1)) {
        throw new IllegalArgumentException(
            "the accuracy of '" + name + "' is " + accuracyFraction + "; wanted from 0 to below 1");
      }
      if (counts != 0 && !(counts >= 100 && counts <= 10_000_000)) {
        throw new IllegalArgumentException(
            "the display of '" + name + "' has " + counts + " counts; wanted 100 to 10000000");
      }
    }

    /** A digital meter of three and a half digits that reads no audio. */
    public Instrument(String name, double inputOhms, double accuracyFraction, AsWritten written) {
      this(name, inputOhms, accuracyFraction, USUAL_COUNTS, Optional.empty(), written);
    }

    /** Whether it has a needle. */
    public boolean analogue() {
      return counts == 0;
    }
  }

  /**
   * What a meter reads of audio.
   *
   * @param trueRms whether it reads the rms of any wave; else the mean of it, scaled for a sine
   * @param lowHertz lower end of its band, above 0
   * @param highHertz upper end of its band
   * @param stepVolts smallest step of its lowest range, above 0
   * @param accuracyFraction of the reading, from 0 to below 1
   */
  public record AudioRange(
      boolean trueRms,
      double lowHertz,
      double highHertz,
      double stepVolts,
      double accuracyFraction) {
    public AudioRange {
      if (!(lowHertz > 0 && highHertz > lowHertz)) {
        throw new IllegalArgumentException(
            "an instrument reads audio from "
                + lowHertz
                + " to "
                + highHertz
                + " Hz; wanted rising");
      }
      if (!(stepVolts > 0 && stepVolts < 1e3)) {
        throw new IllegalArgumentException(
            "an instrument reads audio in steps of " + stepVolts + " V; wanted above 0");
      }
      if (!(accuracyFraction >= 0 && accuracyFraction < 1)) {
        throw new IllegalArgumentException(
            "an instrument's accuracy for audio is "
                + accuracyFraction
                + "; wanted from 0 to below 1");
      }
    }
  }

  public Bench {
    instruments = List.copyOf(instruments);
    Objects.requireNonNull(written);
  }
}
