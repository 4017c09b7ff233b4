package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import java.util.List;
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
  private static final TenthMore HAYLOFT = new TenthMore("hayloft", 1e-9);

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

  static Stream<String> slots() {
    return HAYLOFT
        .slots()
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
    HAYLOFT.moves(slot, List.of("path"), Quantity.SUPPLY_AMPERES, CaseName.TEST);
    if (!OF_DC.contains(slot)) {
      HAYLOFT.moves(slot, AUDIO, Quantity.AUDIO_RMS_VOLTS, CaseName.TEST);
    }
  }

  @ParameterizedTest
  @MethodSource("slots")
  void thereIsNoWayForItsDcToTheDetector(String slot) {
    if (slot.endsWith(":input-ohms")) {
      return; // the one part that the carrier's residue still reaches, through the coupling
    }
    HAYLOFT.leaves(slot, DETECTOR, Quantity.DC_VOLTS, CaseName.TEST);
  }

  @ParameterizedTest
  @MethodSource("resistances")
  void whatTheSupplysCurrentFlowsThroughMovesEveryDcOfTheAmplifier(String slot) {
    HAYLOFT.moves(slot, AMPLIFIER, Quantity.DC_VOLTS, CaseName.NO_SIGNAL);
  }

  @ParameterizedTest
  @MethodSource("capacitances")
  void aCapacitorLeavesTheAmplifiersDcAtRestAlone(String slot) {
    HAYLOFT.leaves(slot, AMPLIFIER, Quantity.DC_VOLTS, CaseName.NO_SIGNAL);
  }
}
