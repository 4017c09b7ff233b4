package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import org.junit.jupiter.api.Test;

/** A curve is what single solves say, point by point, and its figures keep their sense. */
class SweepTest {
  private static TrialCircuit circuit() {
    return new TrialCircuit()
        .generator(330, "in")
        .diode("detector.d1", 1e-7, 1.05, 20, "in", "out")
        .resistor("detector.r", 22e3, "out", Circuit.GROUND)
        .capacitor("detector.c", 1e-9, "out", Circuit.GROUND)
        .want("out", Quantity.DISTORTION)
        .want("out", Quantity.SECOND_HARMONIC)
        .want("out", Quantity.THIRD_HARMONIC)
        .want("out", Quantity.AUDIO_RMS_VOLTS);
  }

  @Test
  void everyPointOfACurveIsASolveOfItsOwn() {
    CompiledCircuit compiled = circuit().signal(1, 0.3, 400).compile();
    SweptFigures swept =
        compiled.sweep(
            compiled.nominalValues(), CaseName.TEST, Slot.DEPTH, new double[] {0.1, 0.5, 0.8});
    assertThat(swept.rows()).hasSize(3);
    for (SweptFigures.Row row : swept.rows()) {
      double[] alone = circuit().signal(1, row.at(), 400).figures();
      for (int i = 0; i < alone.length; i++) {
        assertThat(row.figures().get(i)).isCloseTo(alone[i], within(1e-9 + 1e-6 * alone[i]));
      }
    }
  }

  @Test
  void aFaintCarrierMakesTheSquareLawsSecondHarmonic() {
    // m/4, CHECKS SL-3 (any text on the square-law detector), with no third to speak of.
    double[] figures = circuit().signal(6e-3, 0.6, 400).figures();
    assertThat(figures[1]).isCloseTo(0.15, within(0.003));
    assertThat(figures[2]).isLessThan(0.002);
    assertThat(figures[0]).isCloseTo(Math.hypot(figures[1], figures[2]), within(1e-3));
  }
}
