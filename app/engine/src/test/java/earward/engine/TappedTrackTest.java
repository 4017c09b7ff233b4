package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.Potentiometer;
import earward.block.device.Taper;
import earward.block.device.Terminal;
import earward.block.figure.CaseName;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A track with a tap against the divider that its pieces make. */
class TappedTrackTest {
  private static final double TRACK = 47e3;
  private static final double TAP = 0.2;
  private static final double OHMS = 1e3;
  private static final double FARADS = 100e-9;

  private static CompiledCircuit loudness(double position) {
    Potentiometer track = new Potentiometer(TRACK, Taper.LINEAR, 0, position, false, TAP);
    return new TrialCircuit()
        .generator(330, "in")
        .diode("detector.d1", 1e-7, 1.05, 10, "in", "top")
        .resistor("detector.r", 10e3, "top", Circuit.GROUND)
        .capacitor("detector.c", 1e-9, "top", Circuit.GROUND)
        .part(
            "volume.track",
            track,
            Map.of(
                Terminal.TOP,
                "top",
                Terminal.WIPER,
                "wiper",
                Terminal.BOTTOM,
                Circuit.GROUND,
                Terminal.TAP,
                "tap"))
        .resistor("volume.r", OHMS, "tap", "foot")
        .capacitor("volume.c", FARADS, "foot", Circuit.GROUND)
        .signal(1, 0.3, 400)
        .compile();
  }

  private static double ratio(CompiledCircuit circuit, double hertz) {
    return magnitude(circuit, "wiper", hertz) / magnitude(circuit, "top", hertz);
  }

  private static double magnitude(CompiledCircuit circuit, String place, double hertz) {
    return circuit
        .response(circuit.nominalValues(), CaseName.TEST, place, new double[] {hertz})
        .points()
        .get(0)
        .magnitude();
  }

  /** The divider: what hangs at the tap lies beside the piece below it. */
  private static double divided(double position, double tap, double hertz) {
    double reactance = -1 / (2 * Math.PI * hertz * FARADS);
    double lower = tap * TRACK;
    // lower ∥ (OHMS + jX)
    double sum = lower + OHMS;
    double norm = sum * sum + reactance * reactance;
    double re = lower * (OHMS * sum + reactance * reactance) / norm;
    double im = lower * (reactance * sum - OHMS * reactance) / norm;
    double total = Math.hypot((1 - tap) * TRACK + re, im);
    double above = Math.max(0, position - tap) * TRACK;
    double tapped = Math.hypot(above + re, im) / total;
    return position >= tap ? tapped : tapped * position / tap;
  }

  @ParameterizedTest
  @CsvSource({
    "0.2, 100",
    "0.2, 1000",
    "0.2, 5000",
    "0.1, 100",
    "0.1, 3000",
    "0.7, 100",
    "0.7, 3000"
  })
  void theWiperHasWhatTheDividerGives(double position, double hertz) {
    assertThat(ratio(loudness(position), hertz))
        .isCloseTo(divided(position, TAP, hertz), within(2e-6));
  }

  /** Turned down the bass stays, turned up the response is flat (common practice). */
  @Test
  void theBassStaysWhereItIsTurnedDown() {
    CompiledCircuit low = loudness(0.1);
    CompiledCircuit full = loudness(1);
    assertThat(20 * Math.log10(ratio(low, 100) / ratio(low, 3e3))).isBetween(9.0, 20.0);
    assertThat(20 * Math.log10(ratio(full, 100) / ratio(full, 3e3))).isCloseTo(0, within(1e-6));
  }

  /** Exchanging the outer ends turns the track round, and leaves wiper and tap. */
  @Test
  void theOuterEndsExchangedTurnTheTrackRound() {
    CompiledCircuit circuit = loudness(0.3);
    double[] values = circuit.nominalValues();
    values[circuit.slot("volume.track:reversed")] = 1;
    double wiper = magnitude(circuit, values, "wiper");
    double top = magnitude(circuit, values, "top");
    assertThat(wiper / top).isCloseTo(divided(1 - 0.3, 1 - TAP, 1e3), within(2e-6));
  }

  private static double magnitude(CompiledCircuit circuit, double[] values, String place) {
    return circuit
        .response(values, CaseName.TEST, place, new double[] {1e3})
        .points()
        .get(0)
        .magnitude();
  }
}
