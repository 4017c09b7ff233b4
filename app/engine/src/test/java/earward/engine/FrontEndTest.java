package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.law.ToneCurve;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** The response with what stands before the kit, and against the curve that is wanted. */
class FrontEndTest {
  private static final double CARRIER = 455e3;

  private static double[] figures(FrontEnd frontEnd, ToneCurve curve, double audioFarads) {
    Circuit bare =
        new TrialCircuit()
            .generator(1, "in")
            .diode("detector.d1", 1e-7, 1.05, 1, "in", "out")
            .resistor("detector.r", 10e3, "out", Circuit.GROUND)
            .capacitor("detector.c", 1e-9, "out", Circuit.GROUND)
            .resistor("filter.r", 1e6, "out", "late")
            .capacitor("filter.c", audioFarads, "late", Circuit.GROUND)
            .circuit();
    Circuit circuit = new Circuit(bare.parts(), List.of(), List.of(), frontEnd, curve);
    SolveCase test =
        new SolveCase(
            CaseName.TEST,
            Drive.SIGNAL,
            Map.of(
                Slot.CARRIER_PEAK_VOLTS, 2.0,
                Slot.DEPTH, 0.3,
                Slot.TONE_HERTZ, 100.0,
                Slot.LOWEST_TONE_HERTZ, 100.0,
                Slot.HIGHEST_TONE_HERTZ, 5000.0));
    CompiledCircuit compiled =
        Engine.compile(
            circuit,
            List.of(test),
            List.of(
                new FigureName("late", Quantity.HIGH_EDGE_HERTZ, CaseName.TEST),
                new FigureName("late", Quantity.RESPONSE_DEVIATION_DECIBELS, CaseName.TEST),
                new FigureName("late", Quantity.RESPONSE_DEVIATION_HERTZ, CaseName.TEST)));
    double[] row = new double[3];
    assertThat(compiled.newSolver().solve(compiled.nominalValues(), row).solved()).isTrue();
    return row;
  }

  @Test
  void tunedCircuitsSetTheBandAsTheUniversalResonanceCurveSays() {
    // Terman: one circuit falls 3 dB at f0/2Q; n in a row at that times the root of (2^(1/n) - 1).
    double one = figures(new FrontEnd.TunedCircuits(1, 60), ToneCurve.flat(), 1e-15)[0];
    double three = figures(new FrontEnd.TunedCircuits(3, 60), ToneCurve.flat(), 1e-15)[0];
    double edge = CARRIER / 120;
    assertThat(one).isCloseTo(edge, within(edge * 0.01));
    assertThat(three).isCloseTo(edge * Math.sqrt(Math.cbrt(2) - 1), within(edge * 0.01));
  }

  @Test
  void pointsAreJoinedByStraightLinesInDecibels() {
    FrontEnd points =
        new FrontEnd.Points(List.of(new FrontEnd.Point(2000, -2), new FrontEnd.Point(4000, -8)));
    assertThat(20 * Math.log10(points.share(1000, CARRIER))).isCloseTo(-1, within(1e-9));
    assertThat(20 * Math.log10(points.share(3000, CARRIER))).isCloseTo(-5, within(1e-9));
    assertThat(20 * Math.log10(points.share(5000, CARRIER))).isCloseTo(-11, within(1e-9));
  }

  @Test
  void anRcOfSeventyFiveMicrosecondsLeavesItsOwnCurveNowhere() {
    double farads = 75e-6 / 1e6;
    double seventyFive =
        figures(FrontEnd.FLAT, new ToneCurve(ToneCurve.Kind.SEVENTY_FIVE_MICROSECONDS, 1), farads)[
            1];
    assertThat(Math.abs(seventyFive)).isLessThan(0.15);
  }

  @Test
  void plainDeEmphasisCutsMoreThanTheNorthAmericanCurve() {
    // CHECKS 2.2: a plain 75 µs de-emphasis over-cuts by 1.24 dB at 5 kHz.
    double[] figures =
        figures(FrontEnd.FLAT, new ToneCurve(ToneCurve.Kind.NORTH_AMERICAN_AM, 1), 75e-6 / 1e6);
    assertThat(figures[1]).isCloseTo(-1.24, within(0.15));
    assertThat(figures[2]).isCloseTo(5000, within(1.0));
  }
}
