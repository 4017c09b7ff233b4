package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.OutputSwing;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Power, supply current and heat of the output stage against handbook examples. */
class PowerStageTest {
  private static final double TONE = 400;
  private static final double STIFF_OHMS = 1e-6;

  private static TrialCircuit singleEnded(double volts, double ohms, double quiescent) {
    return new TrialCircuit()
        .battery(volts, STIFF_OHMS, "rail-main")
        .idealAmplifier(false, quiescent, "in", "rail-main")
        .capacitor("power.c", 1, "plus", "out")
        .resistor("load.r", ohms, "out", Circuit.GROUND);
  }

  private static TrialCircuit bridge(double volts, double ohms, double quiescent) {
    return new TrialCircuit()
        .battery(volts, STIFF_OHMS, "rail-main")
        .idealAmplifier(true, quiescent, "in", "rail-main")
        .resistor("load.r", ohms, "plus", "minus");
  }

  private static TrialCircuit clipping(TrialCircuit circuit) {
    return circuit.solved(CaseName.FULL_OUTPUT, Drive.CLIPPING, Map.of(Slot.TONE_HERTZ, TONE));
  }

  private static TrialCircuit anyDrive(TrialCircuit circuit) {
    return circuit.solved(CaseName.HOTTEST, Drive.ANY_DRIVE, Map.of(Slot.TONE_HERTZ, TONE));
  }

  @Test
  void fullOutputOfAnIdealStageIsAsInTheTextbook() {
    // Boylestad and Nashelsky, Example 12.8: +-30 V, 16 ohm: 28.125 W out, 35.81 W in.
    double[] figures =
        clipping(singleEnded(60, 16, 0))
            .want("power.amplifier", Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT)
            .want("supply.battery", Quantity.SUPPLY_AMPERES, CaseName.FULL_OUTPUT)
            .figures();
    assertThat(figures[0]).isCloseTo(28.125, within(0.01));
    assertThat(60 * figures[1]).isCloseTo(35.81, within(0.02));
  }

  @Test
  void supplyCurrentOfAKnownPartAgreesWithItsPublishedEfficiency() {
    // TDA2003 at 14.4 V, 4 ohm, 6 W, 44 mA at rest: 8.573 W from the supply, 70 % (data sheet 69
    // %).
    double lost = 7.2 - 6.928;
    double[] figures =
        clipping(
                new TrialCircuit()
                    .battery(14.4, STIFF_OHMS, "rail-main")
                    .amplifier(
                        false, 0.044, new OutputSwing(lost, 0, lost, 0, 0), "in", "rail-main")
                    .capacitor("power.c", 1, "plus", "out")
                    .resistor("load.r", 4, "out", Circuit.GROUND))
            .want("power.amplifier", Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT)
            .want("supply.battery", Quantity.SUPPLY_AMPERES, CaseName.FULL_OUTPUT)
            .figures();
    assertThat(figures[0]).isCloseTo(6.0, within(0.01));
    assertThat(14.4 * figures[1]).isCloseTo(8.573, within(0.01));
    assertThat(figures[0] / (14.4 * figures[1])).isCloseTo(0.70, within(0.005));
  }

  @Test
  void aBridgeTakesTwiceTheCurrentAndGivesFourTimesThePower() {
    // Data sheets of bridge amplifiers: 2Vp/(pi*RL), Vs^2/(2RL) without losses.
    double[] figures =
        clipping(bridge(6, 16, 0.01))
            .want("power.amplifier", Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT)
            .want("supply.battery", Quantity.SUPPLY_AMPERES, CaseName.FULL_OUTPUT)
            .figures();
    assertThat(figures[0]).isCloseTo(36 / 32.0, within(1e-3));
    assertThat(figures[1]).isCloseTo(0.01 + 2 * 6 / (Math.PI * 16), within(1e-4));
  }

  @Test
  void tenPercentDistortionGivesTheKnownShareMorePower() {
    // Symmetrically clipped sine, total power: 1.288 times the power at the edge of clipping.
    double[] figures =
        clipping(singleEnded(9, 8, 0.004))
            .want("power.amplifier", Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT)
            .want("power.amplifier", Quantity.TEN_PERCENT_WATTS, CaseName.FULL_OUTPUT)
            .figures();
    assertThat(figures[1] / figures[0]).isCloseTo(1.288, within(2e-3));
  }

  @Test
  void theWorstHeatIsThatOfTheWorstSineWhereNothingIsLost() {
    // Vs^2/(2 pi^2 RL) single-ended, 2Vs^2/(pi^2 RL) bridge (Boylestad ch. 12; data sheets).
    double single =
        anyDrive(singleEnded(9, 8, 0))
            .want("power.amplifier", Quantity.DISSIPATION_WATTS, CaseName.HOTTEST)
            .figure();
    double bridged =
        anyDrive(bridge(6, 16, 0))
            .want("power.amplifier", Quantity.DISSIPATION_WATTS, CaseName.HOTTEST)
            .figure();
    assertThat(single).isCloseTo(81 / (2 * Math.PI * Math.PI * 8), within(2e-3));
    assertThat(bridged).isCloseTo(2 * 36 / (Math.PI * Math.PI * 16), within(2e-3));
  }

  @Test
  void overdriveHeatsMoreThanAnySineWhereTheOutputStopsShort() {
    // Square wave: Vc(Vs/2 - Vc)/RL. With Vc = 3 V of 9 V this is above the worst sine within
    // reach.
    OutputSwing swing = new OutputSwing(1.5, 0, 1.5, 0, 0);
    double heat =
        anyDrive(
                new TrialCircuit()
                    .battery(9, STIFF_OHMS, "rail-main")
                    .amplifier(false, 0, swing, "in", "rail-main")
                    .capacitor("power.c", 1, "plus", "out")
                    .resistor("load.r", 8, "out", Circuit.GROUND))
            .want("power.amplifier", Quantity.DISSIPATION_WATTS, CaseName.HOTTEST)
            .figure();
    assertThat(heat)
        .isGreaterThan(81 / (2 * Math.PI * Math.PI * 8))
        .isCloseTo(0.5625, within(3e-3));
  }

  @Test
  void anOldBatterySagsToItsMeanWhereABypassCarriesThePeaks() {
    // Vp = (Vs - R·Vp/(pi·RL))/2, solved by hand for 6 V, 15 ohm, 8 ohm without losses.
    double watts =
        clipping(
                new TrialCircuit()
                    .battery(6, 15, "rail-main")
                    .capacitor("supply.c", 1, "rail-main", Circuit.GROUND)
                    .idealAmplifier(false, 0, "in", "rail-main")
                    .capacitor("power.c", 1, "plus", "out")
                    .resistor("load.r", 8, "out", Circuit.GROUND))
            .want("power.amplifier", Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT)
            .figure();
    double peak = 3 / (1 + 15 / (2 * Math.PI * 8));
    assertThat(watts).isCloseTo(peak * peak / 16, within(1e-3));
  }

  private static double oldBattery(double bypassFarads) {
    OutputSwing swing = new OutputSwing(0.8, 0, 0.8, 0, 0);
    return clipping(
            new TrialCircuit()
                .battery(6, 15, "rail-main")
                .capacitor("supply.c", bypassFarads, "rail-main", Circuit.GROUND)
                .amplifier(false, 0.004, swing, "in", "rail-main")
                .capacitor("power.c", 1, "plus", "out")
                .resistor("load.r", 8, "out", Circuit.GROUND))
        .want("power.amplifier", Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT)
        .figure();
  }

  @Test
  void anOldBatteryGivesLessThanHalfWithoutItsBypass() {
    // PHYSICS 5, measured with a separate solver: old 6 V, 15 ohm, 8 ohm: 0.175 W with the bypass,
    // 0.078 W without. An IC of the 386 class on 6 V: 4 mA, 0.8 V lost at either rail.
    assertThat(oldBattery(4.7e-3)).isCloseTo(0.175, within(0.002));
    assertThat(oldBattery(1e-9)).isCloseTo(0.078, within(0.002));
    assertThat(oldBattery(100e-6)).isBetween(0.085, 0.17);
  }

  @Test
  void unevenClippingReachesTenPercentAtItsOwnPower() {
    // An output that stops 0.4 V below the rail and 1.6 V above ground clips at one side first: its
    // 10 % is worked out here point by point from the wave, capacitor-coupled.
    double watts =
        clipping(
                new TrialCircuit()
                    .battery(9, STIFF_OHMS, "rail-main")
                    .amplifier(false, 0, new OutputSwing(0.4, 0, 1.6, 0, 0), "in", "rail-main")
                    .capacitor("power.c", 1, "plus", "out")
                    .resistor("load.r", 8, "out", Circuit.GROUND))
            .want("power.amplifier", Quantity.TEN_PERCENT_WATTS, CaseName.FULL_OUTPUT)
            .figure();
    double drive = 2.9;
    double[] wave = uneven(drive, 4.1, 2.9);
    while (wave[1] < 0.1) {
      drive += 1e-4;
      wave = uneven(drive, 4.1, 2.9);
    }
    assertThat(watts).isCloseTo(wave[0] / 8, within(0.004 * wave[0] / 8));
    assertThat(watts / (2.9 * 2.9 / 16)).isGreaterThan(1.35);
  }

  /** Mean square and distortion of a sine that is cut at two unlike levels and coupled. */
  private static double[] uneven(double drive, double up, double down) {
    int samples = 2000;
    double mean = 0;
    double square = 0;
    double fundamental = 0;
    for (int s = 0; s < samples; s++) {
      double sine = Math.sin(2 * Math.PI * (s + 0.5) / samples);
      double volts = Math.max(-down, Math.min(up, drive * sine));
      mean += volts / samples;
      square += volts * volts / samples;
      fundamental += 2 * volts * sine / samples;
    }
    double power = square - mean * mean;
    double first = fundamental * fundamental / 2;
    return new double[] {power, Math.sqrt(Math.max(0, power - first) / first)};
  }

  @Test
  void statedPowerIsThatOfTheLoadAlone() {
    // A second resistor at the output takes current, and none of the stated power.
    double[] figures =
        clipping(
                singleEnded(9, 8, 0)
                    .resistor("power.r", 56, "plus", "rail-main")
                    .probe("path", "out", Circuit.GROUND))
            .want("power.amplifier", Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT)
            .figures();
    assertThat(figures[0]).isCloseTo(4.5 * 4.5 / 16, within(2e-3));
  }
}
