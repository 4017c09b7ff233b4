package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.check.Finding;
import earward.block.figure.Quantity;
import java.util.List;
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
}
