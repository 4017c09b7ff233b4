package earward.engine;

import static org.assertj.core.api.Assertions.assertThatThrownBy;

import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** What makes no sense is refused with one sentence that names it. */
class RefusalsTest {
  @Test
  void aFigureAtAPlaceThatIsNotThere() {
    TrialCircuit circuit =
        new TrialCircuit()
            .battery(9, 1, "a")
            .resistor("r", 1e3, "a", Circuit.GROUND)
            .solved(CaseName.TEST, Drive.NO_SIGNAL, Map.of())
            .want("b", Quantity.DC_VOLTS);
    assertThatThrownBy(circuit::compile)
        .isInstanceOf(CircuitException.class)
        .hasMessage("There is no node or probe 'b' in the circuit.");
  }

  @Test
  void aFigureInACaseThatIsNotSolved() {
    TrialCircuit circuit =
        new TrialCircuit()
            .battery(9, 1, "a")
            .resistor("r", 1e3, "a", Circuit.GROUND)
            .want("a", Quantity.DC_VOLTS);
    assertThatThrownBy(circuit::compile).hasMessage("There is no case 'test' to solve.");
  }

  @Test
  void twoFeeds() {
    TrialCircuit circuit = new TrialCircuit().generator(50, "a").tuned(12e3, 40, "a");
    assertThatThrownBy(circuit::compile)
        .hasMessage("The circuit has 2 feeds; it can have one at most.");
  }
}
