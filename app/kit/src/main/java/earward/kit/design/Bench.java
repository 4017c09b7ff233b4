package earward.kit.design;

import java.util.List;
import java.util.Objects;

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
   * A meter for DC.
   *
   * @param name what the sheet calls it
   * @param inputOhms what it loads the circuit with, above 0
   * @param accuracyFraction of the reading, from 0 to below 1
   * @param written how the file had it
   */
  public record Instrument(
      String name, double inputOhms, double accuracyFraction, AsWritten written) {
    public Instrument {
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
    }
  }

  public Bench {
    instruments = List.copyOf(instruments);
    Objects.requireNonNull(written);
  }
}
