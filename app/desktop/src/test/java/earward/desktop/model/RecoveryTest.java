package earward.desktop.model;

import static org.assertj.core.api.Assertions.assertThat;

import earward.desktop.TestWorkshop;
import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class RecoveryTest {
  /** No process has this number: it is above what Linux gives. */
  private static final String DEAD = "99999999-";

  @TempDir private Path folder;

  private void kill() throws IOException {
    try (var files = Files.list(folder)) {
      for (Path file : files.toList()) {
        String name = file.getFileName().toString();
        Files.move(file, folder.resolve(DEAD + name.substring(name.indexOf('-') + 1)));
      }
    }
  }

  @Test
  void whatAKilledProgramHadOpenIsOffered() throws DesignFileException, IOException {
    KitDesign design = Designs.read(TestWorkshop.kit("lantern")).design().withTitle("Mine");
    Recovery recovery = new Recovery(folder);
    assertThat(recovery.keep(design, Optional.of(Path.of("/kits/mine.earward")))).isEmpty();
    assertThat(Recovery.left(folder)).as("the program still runs").isEmpty();
    kill();
    List<Recovery.Left> left = Recovery.left(folder);
    assertThat(left).hasSize(1);
    assertThat(Designs.text(left.get(0).design())).isEqualTo(Designs.text(design));
    assertThat(left.get(0).original()).contains(Path.of("/kits/mine.earward"));
    left.get(0).discard();
    assertThat(Recovery.left(folder)).isEmpty();
  }

  @Test
  void whatWasSavedOrClosedIsNot() throws DesignFileException, IOException {
    Recovery recovery = new Recovery(folder);
    recovery.keep(Designs.read(TestWorkshop.kit("lantern")).design(), Optional.empty());
    recovery.clear();
    kill();
    assertThat(Recovery.left(folder)).isEmpty();
    assertThat(folder.toFile().list()).isEmpty();
  }

  @Test
  void aFolderThatCannotBeWrittenIsSaidInASentence() throws DesignFileException, IOException {
    Path file = Files.writeString(folder.resolve("file"), "no folder");
    assertThat(
            new Recovery(file)
                .keep(Designs.read(TestWorkshop.kit("lantern")).design(), Optional.empty()))
        .contains("autosaved");
  }

  @Test
  void preferencesAreKept() {
    Preferences first = Preferences.in(folder);
    first.theme(Preferences.Theme.DARK);
    first.textPercent(130);
    first.decimalComma(true);
    first.opened(TestWorkshop.kit("lantern"));
    Preferences again = Preferences.in(folder);
    assertThat(again.theme()).isEqualTo(Preferences.Theme.DARK);
    assertThat(again.textPercent()).isEqualTo(130);
    assertThat(again.decimalComma()).isTrue();
    assertThat(again.recent()).hasSize(1);
  }
}
