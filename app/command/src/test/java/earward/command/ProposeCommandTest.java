package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.kit.design.KitDesign;
import earward.kit.design.SettingEntry;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Proposals by way of the command line: each is solved, and read back from the file written. */
class ProposeCommandTest {
  @TempDir Path folder;

  private Path written(KitDesign design) throws IOException {
    return Files.writeString(folder.resolve("kit.earward"), Designs.text(design));
  }

  private KitDesign proposed(Path kit, Object... more) throws DesignFileException {
    Path fresh = folder.resolve("new.earward");
    Object[] words = new Object[more.length + 4];
    words[0] = "propose";
    words[1] = kit;
    words[2] = "-o";
    words[3] = fresh;
    System.arraycopy(more, 0, words, 4, more.length);
    Ran ran = Ran.earward(words);
    assertThat(ran.code()).as(ran.messages()).isLessThan(2);
    assertThat(ran.results()).startsWith(fresh.toString());
    return Designs.read(fresh).design();
  }

  private static List<String> codes(KitDesign design) {
    return TestKits.findings(TestKits.reviewed(design)).stream().map(Finding::code).toList();
  }

  private static String words(KitDesign design, String block, String setting) {
    SettingEntry entry = design.block(block).orElseThrow().settings().get(setting);
    return ((SettingEntry.Words) entry).words();
  }

  private static void assertFault(Ran ran, String... words) {
    assertThat(ran.code()).as(ran.messages()).isEqualTo(2);
    assertThat(ran.results()).isEmpty();
    assertThat(ran.messages()).hasLineCount(1).contains(words);
  }

  @Test
  void whatIsFoundIsClearedByProvenSteps() throws Exception {
    KitDesign ailing = TestKits.starter("lantern").withSetting("volume", "c-wiper", "4.7 nF");
    assertThat(codes(ailing)).contains("coupling-edge");
    KitDesign better = proposed(written(ailing));
    assertThat(codes(better)).doesNotContain("coupling-edge");
    assertThat(TestKits.findings(TestKits.reviewed(better)))
        .noneMatch(finding -> finding.severity() == Severity.STOP);
    assertThat(better.title()).isEqualTo("Lantern");
    assertThat(better.references()).isEqualTo(ailing.references());
  }

  @Test
  void aDesignThatIsWellIsLeftAlone() throws Exception {
    KitDesign boathouse = TestKits.starter("boathouse");
    assertThat(proposed(TestHome.starterKit("boathouse")).blocks()).isEqualTo(boathouse.blocks());
  }

  @Test
  void whatIsKeptIsNotChangedAndOnlyWhatIsInStockIsTaken() throws Exception {
    KitDesign ailing = TestKits.starter("lantern").withSetting("volume", "c-wiper", "4.7 nF");
    KitDesign kept = proposed(written(ailing), "--keep", "volume.c-wiper");
    assertThat(words(kept, "volume", "c-wiper")).isEqualTo("4.7 nF");
    Path stock = Files.writeString(folder.resolve("stock"), "47 nF # a bag of fifty\n\n4.7 kΩ\n");
    KitDesign fromStock = proposed(written(ailing), "--stock", stock);
    assertThat(words(fromStock, "volume", "c-wiper")).isIn("4.7 nF", "47 nF");
    assertThat(words(fromStock, "detector", "c1")).isIn("1.5 nF", "47 nF");
  }

  @Test
  void oneBlockIsProposedByItsOwnEquations() throws Exception {
    Path kit = TestHome.starterKit("hayloft");
    Ran ran = Ran.earward("propose", kit, "-o", folder.resolve("one.earward"), "--block", "filter");
    assertThat(ran.code()).as(ran.messages()).isZero();
    assertThat(ran.results()).contains("filter.c2", "1 nF", "by the design equations");
    KitDesign after = Designs.read(folder.resolve("one.earward")).design();
    assertThat(codes(after)).doesNotContain("treble-edge");
    assertThat(after.block("detector")).isEqualTo(TestKits.starter("hayloft").block("detector"));
  }

  @Test
  void everyFaultOfTheCallIsOneSentence() throws IOException {
    Path kit = TestHome.starterKit("lantern");
    Path fresh = folder.resolve("new.earward");
    assertFault(Ran.earward("propose", kit), "--output");
    assertFault(
        Ran.earward("propose", kit, "-o", fresh, "--block", "tuner"), "'tuner'", "detector");
    assertFault(
        Ran.earward("propose", kit, "-o", fresh, "--block", "loudspeaker"), "no design equations");
    assertFault(Ran.earward("propose", kit, "-o", fresh, "--keep", "c1"), "'c1'", "detector.c1");
    Path stock = Files.writeString(folder.resolve("stock"), "47 nF\nten ohms\n");
    assertFault(Ran.earward("propose", kit, "-o", fresh, "--stock", stock), "line 2", "ten ohms");
    Path missing = folder.resolve("none");
    assertFault(Ran.earward("propose", kit, "-o", fresh, "--stock", missing), missing.toString());
    assertThat(fresh).doesNotExist();
    Path copy = Files.copy(kit, folder.resolve("kit.earward"));
    assertFault(Ran.earward("propose", copy, "-o", copy), "the design itself");
    assertThat(copy).hasSameTextualContentAs(kit);
  }
}
