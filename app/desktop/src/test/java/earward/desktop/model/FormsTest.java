package earward.desktop.model;

import static org.assertj.core.api.Assertions.assertThat;

import earward.desktop.TestWorkshop;
import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class FormsTest {
  private Forms forms;
  private KitDesign design;

  @BeforeEach
  void read() throws DesignFileException {
    forms = new Forms(TestWorkshop.open());
    design = Designs.read(TestWorkshop.kit("lantern")).design();
  }

  private FormRow row(String owner, String id) {
    return forms.rows(design, owner).stream()
        .filter(row -> row.id().equals(id))
        .findFirst()
        .orElseThrow();
  }

  @Test
  void wrongWordsAreNamed() {
    assertThat(forms.fault(design, row("detector", "c1"), "5 kΩ"))
        .hasValueSatisfying(sentence -> assertThat(sentence).contains("5 kΩ"));
    assertThat(forms.fault(design, row("detector", "c1"), "1n5")).isEmpty();
    assertThat(forms.fault(design, row("detector", "c1"), "0,0015 µF")).isEmpty();
    assertThat(forms.fault(design, row("detector", "c1"), "1,500.0 pF")).isPresent();
    assertThat(forms.fault(design, row("volume", "knob"), "140 %")).isPresent();
  }

  @Test
  void aBareNumberOfACapacitorAsksWhichUnitNearestFirst() {
    assertThat(forms.meanings(row("detector", "c1"), "47"))
        .hasSizeGreaterThan(1)
        .contains("47 pF", "47 nF");
    assertThat(forms.meanings(row("volume", "c-wiper"), "330")).first().isEqualTo("330 nF");
    assertThat(forms.meanings(row("volume", "track-ohms"), "47")).isEmpty();
    assertThat(forms.meanings(row("detector", "c1"), "47n")).isEmpty();
  }

  @Test
  void arrowKeysStepThroughThePreferredSeries() {
    FormRow c1 = row("detector", "c1");
    assertThat(forms.stepped(c1, "1.5 nF", true)).isEqualTo("1.8 nF");
    assertThat(forms.stepped(c1, "1.5 nF", false)).isEqualTo("1.2 nF");
    assertThat(forms.stepped(c1, "not a value", true)).isEqualTo("not a value");
    assertThat(forms.stepped(row("volume", "knob"), "40 %", true)).isEqualTo("45 %");
    assertThat(forms.stepped(row("volume", "knob"), "100 %", true)).isEqualTo("100 %");
  }

  @Test
  void everyFormReadsItsOwnWordsBackAndChangesOneThing() {
    for (String owner :
        List.of(Selection.CONDITIONS, Selection.TOLERANCES, Selection.BENCH, Selection.SHEET)) {
      assertThat(forms.rows(design, owner)).isNotEmpty();
      for (FormRow row : forms.rows(design, owner)) {
        assertThat(forms.fault(design, row, row.words())).as(row.name()).isEmpty();
        assertThat(forms.edited(design, row, row.words())).as(row.name()).isEqualTo(design);
        assertThat(row.label()).isNotBlank();
      }
    }
    KitDesign colder = forms.edited(design, row(Selection.CONDITIONS, "ambient"), "10 °C");
    assertThat(colder.conditions().core().ambientCelsius()).isEqualTo(10);
    assertThat(forms.fault(design, row(Selection.CONDITIONS, "highest-ambient"), "20 °C"))
        .isPresent();
    KitDesign tight = forms.edited(design, row(Selection.TOLERANCES, "resistor"), "1 %");
    assertThat(tight.tolerances().byClass()).containsValue(0.01);
    KitDesign two = forms.edited(design, row(Selection.BENCH, "name-1"), "old moving-coil meter");
    assertThat(two.bench().instruments()).hasSize(2);
    KitDesign letter = forms.edited(design, row(Selection.SHEET, "paper"), "Letter");
    assertThat(letter.sheet().paper().key()).isEqualTo("Letter");
  }

  @Test
  void aLockIsKeptInTheFile() throws DesignFileException {
    KitDesign locked = design.withBlock("detector", block -> block.withLock("c1", true));
    KitDesign back = Designs.read(Designs.text(locked), "locked.earward").design();
    assertThat(back.block("detector").orElseThrow().locked()).containsExactly("c1");
    assertThat(Proposing.locked(back)).containsExactly("detector.c1");
    assertThat(Designs.text(design)).doesNotContain("locked");
  }
}
