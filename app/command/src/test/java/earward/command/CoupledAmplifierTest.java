package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.Slot;
import earward.engine.Solver;
import earward.kit.path.CompiledKit;
import earward.kit.path.Figures;
import earward.kit.path.KitSolver;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The amplifier's side of the one circuit, in the Hayloft, whose single-ended stage takes its audio
 * current from the rail: every part around the amplifier, in the loudspeaker and in the supply's
 * lead, a tenth larger, moves output, loudspeaker, rail and supply current alike, and the DC of the
 * detector, which two capacitors keep apart, not at all.
 */
class CoupledAmplifierTest {
  /** Solves of the same row agree to a few parts in 1e10. */
  private static final double MOVED = 2e-9;

  private static final double STILL = 1e-9;

  private static final Set<String> VALUES =
      Set.of(
          "ohms",
          "farads",
          "volts",
          "internal-ohms",
          "dc-ohms",
          "voice-coil-henries",
          "resonance-hertz",
          "mechanical-q",
          "electrical-q",
          "quiescent-amperes",
          "feedback-ohms",
          "input-ohms",
          "series-ohms");

  /** What only moves DC: an e.m.f. alone changes no small signal of a stage that does not clip. */
  private static final Set<String> OF_DC = Set.of("battery.battery:volts");

  private static final List<String> AUDIO =
      List.of("power.output", "loudspeaker.hot", "battery.rail");
  private static final List<String> DETECTOR =
      List.of("detector.out", "filter.out", "volume.top", "volume.wiper");
  private static final List<String> AMPLIFIER = List.of("power.output", "battery.rail");

  private static final CompiledKit KIT =
      KitSolver.compile(TestKits.assembled(TestKits.starter("hayloft")));
  private static final Solver SOLVER = KIT.circuit().newSolver();
  private static final Map<String, Figures> CHANGED = new HashMap<>();
  private static final Figures NOMINAL = solved(KIT.circuit().nominalValues());

  private static Figures solved(double[] values) {
    double[] row = new double[KIT.circuit().figures().size()];
    assertThat(SOLVER.solve(values, row).solved()).isTrue();
    return KIT.figures(row);
  }

  private static Figures withATenthMore(String slot) {
    return CHANGED.computeIfAbsent(slot, CoupledAmplifierTest::changed);
  }

  private static Figures changed(String slot) {
    double[] values = KIT.circuit().nominalValues();
    values[KIT.circuit().slot(slot)] *= 1.1;
    return solved(values);
  }

  private static double moved(Figures figures, String place, Quantity quantity, CaseName name) {
    FigureName figure = new FigureName(place, quantity, name);
    double nominal = NOMINAL.orNaN(figure);
    return nominal == 0 ? figures.orNaN(figure) : Math.abs(figures.orNaN(figure) / nominal - 1);
  }

  static Stream<String> slots() {
    return KIT.circuit().slots().stream()
        .filter(slot -> slot.nominal() != 0 && Double.isFinite(slot.nominal()))
        .map(Slot::name)
        .filter(name -> name.matches("(power|loudspeaker|battery)\\..*"))
        .filter(name -> VALUES.contains(name.substring(name.indexOf(':') + 1)));
  }

  static Stream<String> resistances() {
    return slots().filter(name -> name.matches("battery\\..*(volts|ohms)|.*quiescent-amperes"));
  }

  static Stream<String> capacitances() {
    return slots().filter(name -> name.endsWith(":farads"));
  }

  @Test
  void theSlotsThatAreMovedAreThere() {
    assertThat(slots()).hasSizeGreaterThanOrEqualTo(22);
    assertThat(resistances()).hasSizeGreaterThanOrEqualTo(5);
    assertThat(capacitances()).hasSizeGreaterThanOrEqualTo(7);
  }

  @ParameterizedTest
  @MethodSource("slots")
  void aPartOfTheAmplifiersSideMovesAllThatItIsCoupledTo(String slot) {
    Figures after = withATenthMore(slot);
    assertThat(moved(after, "path", Quantity.SUPPLY_AMPERES, CaseName.TEST))
        .as("supply by %s", slot)
        .isGreaterThan(MOVED);
    if (!OF_DC.contains(slot)) {
      for (String place : AUDIO) {
        assertThat(moved(after, place, Quantity.AUDIO_RMS_VOLTS, CaseName.TEST))
            .as("%s by %s", place, slot)
            .isGreaterThan(MOVED);
      }
    }
  }

  @ParameterizedTest
  @MethodSource("slots")
  void thereIsNoWayForItsDcToTheDetector(String slot) {
    if (slot.endsWith(":input-ohms")) {
      return; // the one part that the carrier's residue still reaches, through the coupling
    }
    Figures after = withATenthMore(slot);
    for (String place : DETECTOR) {
      assertThat(moved(after, place, Quantity.DC_VOLTS, CaseName.TEST))
          .as("%s by %s", place, slot)
          .isLessThan(STILL);
    }
  }

  @ParameterizedTest
  @MethodSource("resistances")
  void whatTheSupplysCurrentFlowsThroughMovesEveryDcOfTheAmplifier(String slot) {
    Figures after = withATenthMore(slot);
    for (String place : AMPLIFIER) {
      assertThat(moved(after, place, Quantity.DC_VOLTS, CaseName.NO_SIGNAL))
          .as("%s by %s", place, slot)
          .isGreaterThan(MOVED);
    }
  }

  @ParameterizedTest
  @MethodSource("capacitances")
  void aCapacitorLeavesTheAmplifiersDcAtRestAlone(String slot) {
    Figures after = withATenthMore(slot);
    for (String place : AMPLIFIER) {
      assertThat(moved(after, place, Quantity.DC_VOLTS, CaseName.NO_SIGNAL))
          .as("%s by %s", place, slot)
          .isLessThan(STILL);
    }
  }
}
