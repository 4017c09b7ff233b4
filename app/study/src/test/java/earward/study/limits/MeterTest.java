package earward.study.limits;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.kit.design.AsWritten;
import earward.kit.design.Bench.AudioRange;
import earward.kit.design.Bench.Instrument;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;

/** Meters held against published tables and handbook figures. */
class MeterTest {
  private static final AudioRange MEAN = new AudioRange(false, 40, 400, 0.1, 0.015);
  private static final AudioRange TRUE = new AudioRange(true, 40, 1000, 0.001, 0.01);

  private static Meter digital() {
    return new Meter(new Instrument("pocket", 10e6, 0.005, AsWritten.NEW));
  }

  private static Meter needle() {
    return new Meter(new Instrument("needle", 20e3, 0.03, 0, Optional.empty(), AsWritten.NEW));
  }

  private static Meter audio(AudioRange range) {
    return new Meter(new Instrument("audio", 10e6, 0.005, 2000, Optional.of(range), AsWritten.NEW));
  }

  /** Common practice: 9.00 V on a 20 V range at ±(0.5 % + 2 digits) is ±0.065 V. */
  @Test
  void accuracyIsShareOfTheReadingAndDigits() {
    assertThat(digital().rangeVolts(9)).isCloseTo(20, within(1e-9));
    assertThat(digital().stepVolts(9)).isCloseTo(0.01, within(1e-12));
    assertThat(digital().errorVolts(9)).isCloseTo(0.065, within(1e-9));
    assertThat(digital().errorVolts(-9)).isCloseTo(0.065, within(1e-9));
    assertThat(digital().floor(4.237)).isCloseTo(4.23, within(1e-9));
    assertThat(digital().ceiling(4.231)).isCloseTo(4.24, within(1e-9));
  }

  /** Common practice: a needle errs by 3 % of its full scale, on 10 V by 0.3 V. */
  @Test
  void aNeedleErrsByShareOfFullScale() {
    double readOff = needle().stepVolts(6);
    assertThat(needle().errorVolts(6) - readOff).isCloseTo(0.3, within(1e-9));
  }

  /** V·Rin/(Rin + R): 100 kΩ behind 10 MΩ reads 0.99 % low, behind 20 kΩ/V on 2.5 V a third. */
  @Test
  void aMeterLoadsWhatItReads() {
    assertThat(digital().reading(1, 100e3)).isCloseTo(1 - 0.0099, within(1e-4));
    assertThat(needle().inputOhms(2)).isCloseTo(50e3, within(1e-6));
    assertThat(needle().inputOhms(9)).isCloseTo(200e3, within(1e-6));
    assertThat(needle().reading(2, 100e3)).isCloseTo(2 / 3.0, within(1e-9));
  }

  private static double[] wave(DoubleUnaryOperator law) {
    double[] samples = new double[36_000];
    for (int i = 0; i < samples.length; i++) {
      samples[i] = law.applyAsDouble((i + 0.5) / samples.length);
    }
    return samples;
  }

  /** Error of an average-responding meter by wave (Sefram 7314 manual, p. 28; TES-2620, p. 19). */
  @Test
  void anAverageRespondingMeterIsRightOnSinesOnly() {
    double[] sine = wave(t -> Math.sin(2 * Math.PI * t));
    double[] square = wave(t -> t < 0.5 ? 1 : -1);
    double[] triangle = wave(t -> 4 * Math.abs(t - 0.5) - 1);
    assertThat(ratio(sine)).isCloseTo(1, within(1e-6));
    assertThat(ratio(square)).isCloseTo(1.110, within(0.001));
    assertThat(ratio(triangle)).isCloseTo(1 - 0.038, within(0.001));
    double mean = 2 * Math.sqrt(2) / Math.PI;
    double[] fullWave = wave(t -> Math.abs(Math.sqrt(2) * Math.sin(2 * Math.PI * t)) - mean);
    assertThat(audio(TRUE).audioReading(fullWave)).isCloseTo(0.435, within(0.001));
    assertThat(audio(MEAN).audioReading(fullWave)).isCloseTo(0.421, within(0.001));
  }

  private static double ratio(double[] wave) {
    return audio(MEAN).audioReading(wave) / audio(TRUE).audioReading(wave);
  }

  /** The bound for harmonics holds over all phases of a third harmonic. */
  @Test
  void harmonicsMoveAReadingWithinTheStatedError() {
    for (AudioRange range : new AudioRange[] {MEAN, TRUE}) {
      Meter meter = audio(range);
      double stated = meter.audioErrorVolts(1, 0.1) - meter.audioErrorVolts(1, 0);
      for (int phase = 0; phase < 24; phase++) {
        double shift = 2 * Math.PI * phase / 24;
        double[] wave =
            wave(
                t ->
                    Math.sqrt(2)
                        * (Math.sin(2 * Math.PI * t) + 0.1 * Math.sin(6 * Math.PI * t + shift)));
        assertThat(Math.abs(meter.audioReading(wave) - 1)).isLessThanOrEqualTo(stated + 1e-6);
      }
    }
  }

  @Test
  void whatAnInstrumentCannotReadIsSaid() {
    assertThat(digital().audioTrouble(400, 1)).contains(AudioTrouble.NO_AUDIO);
    assertThat(audio(MEAN).audioTrouble(1000, 5)).contains(AudioTrouble.OUT_OF_BAND);
    assertThat(audio(MEAN).audioTrouble(400, 0.5)).contains(AudioTrouble.TOO_SMALL);
    assertThat(audio(TRUE).audioTrouble(400, 0.5)).isEmpty();
  }
}
