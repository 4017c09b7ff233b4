package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.check.Finding;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Outside the domain of the averaged method a finding says so; inside nothing is said. */
class DomainTest {
  private static List<Finding> findings(TrialCircuit circuit) {
    CompiledCircuit compiled = circuit.want("out", Quantity.DC_VOLTS).compile();
    SolveOutcome outcome = compiled.newSolver().solve(compiled.nominalValues(), new double[1]);
    assertThat(outcome.solved()).isTrue();
    return outcome.findings();
  }

  private static TrialCircuit detector(double farads, double peakVolts, double toneHertz) {
    return new TrialCircuit()
        .generator(330, "in")
        .diode("detector.d1", 1e-7, 1.05, 20, "in", "out")
        .resistor("detector.r", 22e3, "out", Circuit.GROUND)
        .capacitor("detector.c", farads, "out", Circuit.GROUND)
        .signal(peakVolts, 0.3, toneHertz);
  }

  @Test
  void insideNothingIsSaid() {
    assertThat(findings(detector(1e-9, 1, 400))).isEmpty();
  }

  @Test
  void aToneTooNearTheCarrier() {
    assertThat(findings(detector(1e-9, 1, 20e3)))
        .extracting(Finding::code)
        .contains("outside-domain");
  }

  @Test
  void aCarrierTooLarge() {
    assertThat(findings(detector(1e-9, 12, 400)))
        .extracting(Finding::sentence)
        .anyMatch(s -> s.contains("12.0 V"));
  }

  @Test
  void aReservoirTooSmallForTheCarrier() {
    assertThat(findings(detector(100e-12, 1, 400)))
        .extracting(Finding::sentence)
        .anyMatch(s -> s.contains("carrier cycles"));
  }

  @Test
  void theSentenceNamesThePlace() {
    assertThat(findings(detector(1e-9, 1, 20e3)))
        .extracting(Finding::sentence)
        .anyMatch(s -> s.contains("'feed.generator'"));
    assertThat(findings(detector(100e-12, 1, 400)))
        .extracting(Finding::sentence)
        .anyMatch(s -> s.contains("'detector.d1'"));
  }

  @Test
  void tenthHarmonicsOfTheToneMustStayUnderAThirdOfTheCarrier() {
    // PHYSICS 3: 10·fm < fc/3; at 455 kHz this ends at 15.2 kHz, where fc/fm is still 30.
    assertThat(findings(detector(1e-9, 1, 11.3e3))).isEmpty();
    assertThat(findings(detector(1e-9, 1, 11.5e3))).hasSize(1);
  }

  @Test
  void aCycleThatDoesNotSettleIsSaidWithItsPlace() {
    // eighty volts: pulses that not even the finest samples of a cycle meet
    CompiledCircuit compiled =
        new TrialCircuit()
            .generator(0.5, "in")
            .diode("detector.d1", 1e-9, 1, 0.01, "in", "out")
            .resistor("detector.r", 1e6, "out", Circuit.GROUND)
            .capacitor("detector.c", 1e-9, "out", Circuit.GROUND)
            .signal(80, 0.3, 400)
            .want("out", Quantity.DC_VOLTS)
            .compile();
    double[] figures = new double[1];
    SolveOutcome outcome = compiled.newSolver().solve(compiled.nominalValues(), figures);
    assertThat(outcome.solved()).isEqualTo(!Double.isNaN(figures[0]));
    assertThat(outcome.findings())
        .extracting(Finding::sentence)
        .anyMatch(s -> s.contains("'detector.d1'") || s.contains("'feed.generator'"));
  }

  @Test
  void anAudioPeriodWithAnEdgeInIt() {
    // An AC load of a three-hundredth of the DC load: current flows at the envelope's tips only.
    List<Finding> found =
        findings(
            new TrialCircuit()
                .generator(330, "in")
                .diode("detector.d1", 1e-7, 1.05, 20, "in", "out")
                .resistor("detector.r", 47e3, "out", Circuit.GROUND)
                .capacitor("detector.c", 200e-12, "out", Circuit.GROUND)
                .capacitor("volume.cc", 10e-6, "out", "wiper")
                .resistor("volume.r", 150, "wiper", Circuit.GROUND)
                .signal(5, 0.95, 400));
    assertThat(found).extracting(Finding::code).contains("harmonics-cut-off");
  }

  @Test
  void pulsesNarrowerThanTheFinestSamples() {
    // A pulse is about √(nVt/E) wide: at 16 V 0.040 rad, less than 128 samples leave between two.
    List<Finding> found =
        findings(
            new TrialCircuit()
                .generator(0.1, "in")
                .diode("detector.d1", 1e-9, 1, 0.1, "in", "out")
                .resistor("detector.r", 1e6, "out", Circuit.GROUND)
                .capacitor("detector.c", 1e-9, "out", Circuit.GROUND)
                .signal(16, 0.3, 400));
    assertThat(found)
        .filteredOn(finding -> finding.code().equals("harmonics-cut-off"))
        .extracting(Finding::sentence)
        .anyMatch(s -> s.contains("narrower") && s.contains("'detector.d1'"));
  }

  @Test
  void aKitThatCannotBeSolvedNamesItsWorstNode() {
    // a value that is no number, as a broken batch might bring it
    CompiledCircuit compiled =
        new TrialCircuit()
            .resistor("r", 1e3, "a", Circuit.GROUND)
            .solved(CaseName.NO_SIGNAL, Drive.NO_SIGNAL, Map.of())
            .want("a", Quantity.DC_VOLTS, CaseName.NO_SIGNAL)
            .compile();
    double[] values = compiled.nominalValues();
    values[compiled.slot("r:ohms")] = Double.NaN;
    SolveOutcome outcome = compiled.newSolver().solve(values, new double[1]);
    assertThat(outcome.solved()).isFalse();
    assertThat(outcome.findings())
        .extracting(Finding::sentence)
        .anyMatch(s -> s.contains("node 'a'"));
  }
}
