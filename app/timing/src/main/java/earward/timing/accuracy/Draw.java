package earward.timing.accuracy;

import java.util.SplittableRandom;

/**
 * The values of one random design, drawn from its seed and number alone, so that any part of a run
 * can be repeated. Domain: PHYSICS.md 3.
 *
 * @param number of the design
 * @param kind what detects
 * @param tuned whether the feed is a winding
 * @param carrierHertz 262 kHz to 2 MHz
 * @param cyclesPerTone carrier over tone, a whole number; the tone is 100 Hz to 5 kHz
 * @param peakVolts 50 mV to 3 V
 * @param depth 0.1 to 0.95
 * @param sourceOhms of an untuned feed, or Rp of a winding
 * @param quality 8 to 60
 * @param detuningHertz within half of the winding's bandwidth
 * @param reservoirCycles time constant of the reservoir, 2 to 500 carrier cycles
 * @param loadOhms R1 across the reservoir
 * @param acShare RL over R1
 * @param saturationAmperes of the diode
 * @param emission its n
 * @param seriesOhms its series resistance
 * @param junctionFarads its capacitance, at most a tenth of the reservoir
 * @param restAmperes bias of a biased diode or of a transistor
 * @param pinchOffVolts of a field-effect transistor
 * @param filterFarads C2 behind R2
 */
public record Draw(
    int number,
    DetectorKind kind,
    boolean tuned,
    double carrierHertz,
    int cyclesPerTone,
    double peakVolts,
    double depth,
    double sourceOhms,
    double quality,
    double detuningHertz,
    double reservoirCycles,
    double loadOhms,
    double acShare,
    double saturationAmperes,
    double emission,
    double seriesOhms,
    double junctionFarads,
    double restAmperes,
    double pinchOffVolts,
    double filterFarads) {
  private static final double LEAST_RESERVOIR = 47e-12;

  /** The design of a number; nothing is drawn twice. */
  public static Draw of(long seed, int number) {
    SplittableRandom random = new SplittableRandom(seed * 1_000_003 + number);
    DetectorKind kind = DetectorKind.of(number);
    boolean coin = random.nextBoolean();
    boolean tuned =
        switch (kind) {
          case UNTUNED_DIODE -> false;
          case TUNED_DIODE, FULL_WAVE -> true;
          case DOUBLER, BIASED_DIODE, TRANSISTOR_FOLLOWER, FIELD_EFFECT_FOLLOWER -> coin;
        };
    double carrier = between(random, 262e3, 2e6);
    double tone = between(random, 100, 5000);
    double quality = between(random, 8, 60);
    double cycles = between(random, 2, 500);
    double most = Math.min(100e3, cycles / (carrier * LEAST_RESERVOIR));
    double load = between(random, 5e3, most);
    double reservoir = cycles / (carrier * load);
    double halfBand = carrier / quality / 2;
    return new Draw(
        number,
        kind,
        tuned,
        carrier,
        (int) Math.round(carrier / tone),
        between(random, 0.05, 3),
        random.nextDouble(0.1, 0.95),
        tuned ? between(random, 5e3, 30e3) : between(random, 50, 2200),
        quality,
        random.nextBoolean() ? 0 : random.nextDouble(-halfBand, halfBand),
        cycles,
        load,
        between(random, 0.5, 20),
        between(random, 2e-9, 5e-6),
        random.nextDouble(1.02, 1.2),
        between(random, 5, 60),
        Math.min(0.1 * reservoir, between(random, 0.3e-12, 2.5e-12)),
        between(random, 1e-6, 1e-4),
        random.nextDouble(0.8, 3),
        between(random, 47e-12, 470e-12));
  }

  private static double between(SplittableRandom random, double least, double most) {
    return least * Math.exp(random.nextDouble() * Math.log(most / least));
  }

  /** The tone, in Hz. */
  public double toneHertz() {
    return carrierHertz / cyclesPerTone;
  }

  /** C1. */
  public double reservoirFarads() {
    return reservoirCycles / (carrierHertz * loadOhms);
  }
}
