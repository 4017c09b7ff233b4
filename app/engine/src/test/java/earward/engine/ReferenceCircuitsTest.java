package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.Capacitor;
import earward.block.device.CarrierGenerator;
import earward.block.device.Device;
import earward.block.device.Dielectric;
import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.device.TunedFeed;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/**
 * The twelve reference detectors through the engine's own door: the circuit compiled, the carrier-
 * driven diode found, figures read. Source of the numbers: detector-cases.csv, solved at the full
 * carrier rate by a separate program (fourth-order Runge-Kutta, 200 and 400 steps a cycle).
 */
class ReferenceCircuitsTest {
  /** The table stands at 27 °C; its saturation current is that of this temperature. */
  private static final double CELSIUS = 27;

  @ParameterizedTest(name = "case {0}")
  @CsvFileSource(resources = "/earward/engine/detector-cases.csv", numLinesToSkip = 1)
  void figuresAgreeWithTheFullWaveform(
      String name,
      String feed,
      double saturationAmperes,
      double n,
      double seriesOhms,
      double carrierHertz,
      double toneHertz,
      double sourceOhms,
      double quality,
      double peakVolts,
      double depth,
      double c1,
      double r1,
      double r2,
      double c2,
      double cc,
      double rl,
      double directVolts,
      double audioVolts,
      double distortionPercent,
      double rippleVolts,
      double inputWatts) {
    List<CircuitPart> parts = new ArrayList<>();
    if (feed.equals("tuned")) {
      TunedFeed can = new TunedFeed(sourceOhms, quality, 0, 1, 0.001);
      parts.add(
          new CircuitPart(
              "feed.can", can, Map.of(Terminal.TOP, "in", Terminal.BOTTOM, Circuit.GROUND)));
    } else {
      parts.add(
          new CircuitPart(
              "feed.generator",
              new CarrierGenerator(sourceOhms),
              Map.of(Terminal.TOP, "in", Terminal.BOTTOM, Circuit.GROUND)));
    }
    double ratio = saturationRatio(n);
    DiodeModel model =
        DiodeModel.plain("D", DiodeMaterial.SCHOTTKY, saturationAmperes / ratio, n, seriesOhms);
    parts.add(
        new CircuitPart(
            "detector.d1", new Diode(model), Map.of(Terminal.ANODE, "in", Terminal.CATHODE, "a")));
    add(parts, "c1", film(c1), "a", Circuit.GROUND);
    add(parts, "r1", new Resistor(r1), "a", Circuit.GROUND);
    add(parts, "r2", new Resistor(r2), "a", "b");
    add(parts, "c2", film(c2), "b", Circuit.GROUND);
    add(parts, "cc", film(cc), "b", "w");
    add(parts, "rl", new Resistor(rl), "w", Circuit.GROUND);
    SolveCase test =
        new SolveCase(
            CaseName.TEST,
            Drive.SIGNAL,
            Map.of(
                Slot.CARRIER_HERTZ, carrierHertz,
                Slot.CARRIER_PEAK_VOLTS, peakVolts,
                Slot.DEPTH, depth,
                Slot.TONE_HERTZ, toneHertz,
                Slot.AMBIENT_CELSIUS, CELSIUS));
    List<FigureName> wanted =
        List.of(
            new FigureName("a", Quantity.DC_VOLTS, CaseName.TEST),
            new FigureName("w", Quantity.AUDIO_RMS_VOLTS, CaseName.TEST),
            new FigureName("w", Quantity.DISTORTION, CaseName.TEST));
    CompiledCircuit compiled =
        Engine.compile(new Circuit(parts, List.of(), List.of()), List.of(test), wanted);
    double[] figures = new double[3];

    SolveOutcome outcome = compiled.newSolver().solve(compiled.nominalValues(), figures);

    assertThat(outcome.findings()).isEmpty();
    assertThat(figures[0]).isCloseTo(directVolts, within(5e-3 * directVolts));
    assertThat(figures[1]).isCloseTo(audioVolts, within(5e-3 * audioVolts));
    assertThat(100 * figures[2]).isCloseTo(distortionPercent, within(0.2));
  }

  private static double saturationRatio(double n) {
    return earward.engine.law.Temperature.saturationRatio(DiodeMaterial.SCHOTTKY, n, CELSIUS);
  }

  private static Capacitor film(double farads) {
    return new Capacitor(farads, Dielectric.FILM, 63, 0, 0);
  }

  private static void add(List<CircuitPart> parts, String name, Device device, String a, String b) {
    parts.add(new CircuitPart("detector." + name, device, Map.of(Terminal.A, a, Terminal.B, b)));
  }
}
