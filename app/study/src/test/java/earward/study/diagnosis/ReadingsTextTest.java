package earward.study.diagnosis;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import earward.block.Conditions;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.kit.design.FrontEndSupply;
import earward.kit.design.KitConditions;
import earward.kit.design.KitDesign;
import earward.study.faults.FaultReading;
import earward.study.faults.ReadingError;
import earward.study.faults.Tone;
import java.util.List;
import org.junit.jupiter.api.Test;

class ReadingsTextTest {
  private static final String DIGEST = "fceadd1e" + "0".repeat(56);
  private static final List<FaultReading> READINGS =
      List.of(reading("TP7:no-signal", Unit.VOLT), reading("TP7:ohms", Unit.OHM));

  private static FaultReading reading(String key, Unit unit) {
    FigureName figure = new FigureName("power.output", Quantity.DC_VOLTS, CaseName.NO_SIGNAL);
    return new FaultReading(key, "power.output", unit, figure, false);
  }

  private static Evidence read(String text) throws ReadingsException {
    Conditions core = new Conditions(455e3, 400, 4500, 150, 0.3, 0.7, 0.25, 1.5, 4, 25, 40, 0.2);
    KitDesign design = KitDesign.empty("kit", KitConditions.of(core, FrontEndSupply.BATTERY));
    return new ReadingsText("r.csv", READINGS, design, DIGEST).read(text);
  }

  @Test
  void linesAreReadWhateverPartsThem() throws ReadingsException {
    Evidence evidence =
        read(
            """
            # first switch-on
            reading,value
            revision,A
            digest,FCEADD1E
            tp7:no-signal;4,7 V
            "TP7:ohms"	over range
            tone,Silent
            heat,hot
            """);
    assertThat(evidence.readings())
        .containsEntry("TP7:no-signal", List.of(4.7))
        .containsEntry("TP7:ohms", List.of(ReadingError.MOST_OHMS));
    assertThat(evidence.tones()).containsExactly(Tone.SILENT);
    assertThat(evidence.heats()).containsExactly(true);
    assertThat(read("TP7:no-signal,\ntone,usual\n").size()).isEqualTo(1);
  }

  @Test
  void whatCannotBeReadNamesItsLine() {
    refused("TP77:ohms,3 Ω", "r.csv, line 1 has the reading 'TP77:ohms', which this kit has not");
    refused("tone,purple", "line 1 says the tone is 'purple'; it can be silent");
    refused("heat,warm", "line 1 says heat is 'warm'; it can be hot or cool");
    refused("TP7:no-signal,many", "line 1 cannot be read");
    refused("TP7:ohms,4 Ω\nTP7:ohms,5 Ω\nTP7:ohms,6 Ω", "line 3 has the reading TP7:ohms a third");
    refused("nonsense", "line 1 is 'nonsense'");
    refused("", "r.csv has no reading");
    refused("revision,B\ntone,silent", "is of revision B, and the design at hand is A");
    refused("digest,00000000\ntone,silent", "is of design 00000000");
  }

  private static void refused(String text, String sentence) {
    assertThatThrownBy(() -> read(text))
        .isInstanceOf(ReadingsException.class)
        .hasMessageContaining(sentence);
  }
}
