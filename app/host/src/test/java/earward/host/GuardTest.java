package earward.host;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import earward.block.BlockTexts;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.setting.Values;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What a loaded type does later, and what it can see. */
class GuardTest {
  static final Values NO_VALUES = Values.of(Map.of());
  static final Conditions CONDITIONS =
      new Conditions(455e3, 400, 4500, 150, 0.3, 0.9, 0.2, 1, 3, 20, 40, 0.5);

  @TempDir Path folder;

  @Test
  void anExceptionLaterIsBlamedOnThePlugin() throws IOException {
    assertFails("Object o = null; o.hashCode();", "load.odd.describe", "NullPointerException");
  }

  @Test
  void aMissingClassLaterIsBlamedOnThePlugin() throws IOException {
    assertFails("if (true) throw new NoClassDefFoundError(\"x/Y\");", "x/Y");
  }

  @Test
  void nullInPlaceOfADescriptionIsBlamedOnThePlugin() throws IOException {
    assertFails("if (true) return null;", "null", "load.odd.describe");
  }

  @Test
  void settingsThatDoNotGoTogetherKeepThePluginsOwnSentence() throws IOException {
    try (PluginSet set =
        odd("", "if (true) throw new IllegalArgumentException(\"8 ohms is too low\");")) {
      BlockType type = set.find("load.odd").orElseThrow();
      assertThatThrownBy(() -> type.describe(NO_VALUES, CONDITIONS))
          .isExactlyInstanceOf(IllegalArgumentException.class)
          .hasMessage("8 ohms is too low");
    }
  }

  @Test
  void aListWithANullInItIsBlamedOnThePlugin() throws IOException {
    String judge =
        """
        public List<earward.block.check.Finding> judge(
            Values v, Conditions c, java.util.function.ToDoubleFunction<String> f) {
          return Arrays.asList((earward.block.check.Finding) null);
        }
        """;
    try (PluginSet set = odd(judge, "")) {
      BlockType type = set.find("load.odd").orElseThrow();
      assertThatThrownBy(() -> type.judge(NO_VALUES, CONDITIONS, name -> 0))
          .isInstanceOf(PluginFailure.class)
          .hasMessageContaining("Plug-in 'odd'");
    }
  }

  @Test
  void aProposerIsGuardedToo() throws IOException {
    String proposer = "public Optional<Proposer> proposer() { return Optional.of(asked -> null); }";
    try (PluginSet set = odd(proposer, "")) {
      var offered = set.find("load.odd").orElseThrow().proposer().orElseThrow();
      var asked = new earward.block.Proposer.Setting(NO_VALUES, CONDITIONS, 1, 1);
      assertThatThrownBy(() -> offered.propose(asked))
          .isInstanceOf(PluginFailure.class)
          .hasMessageContaining("load.odd.propose");
    }
  }

  @Test
  void aPluginDoesNotSeeTheProgramTheWidgetsOrItsTestkit() throws IOException {
    for (String hidden :
        new String[] {
          "earward.host.Plugins",
          "org.junit.jupiter.api.Test",
          "javax.swing.JFrame",
          "java.awt.Color",
          "earward.block.testkit.BlockContract"
        }) {
      assertFails(lookUp(hidden), "ClassNotFoundException");
    }
  }

  @Test
  void aPluginSeesTheJdkBlockApiAndItself() throws IOException {
    for (String seen :
        new String[] {
          "java.util.logging.Logger", "java.sql.Date", "earward.block.wiring.Wiring", "sample.Odd"
        }) {
      try (PluginSet set = odd("", lookUp(seen))) {
        BlockType type = set.find("load.odd").orElseThrow();
        assertThat(type.describe(NO_VALUES, CONDITIONS).wiring().parts()).hasSize(1);
      }
    }
  }

  @Test
  void theWordsComeFromThePluginsOwnJar() throws IOException {
    JarWriter.plugin("odd")
        .soundType("Odd", "load.odd")
        .services("sample.Odd")
        .entry("sample/texts.properties", "load.odd.name = Odd load\n")
        .write(folder.resolve("odd.jar"));
    try (PluginSet set = Plugins.load(folder)) {
      BlockType type = set.find("load.odd").orElseThrow();
      assertThat(BlockTexts.of(type, Locale.ENGLISH).find("name")).contains("Odd load");
    }
  }

  private static String lookUp(String className) {
    return "try { Class.forName(\""
        + className
        + "\"); } catch (ClassNotFoundException e) { throw new IllegalStateException(e); }";
  }

  private void assertFails(String body, String... words) throws IOException {
    try (PluginSet set = odd("", body)) {
      BlockType type = set.find("load.odd").orElseThrow();
      assertThatThrownBy(() -> type.describe(NO_VALUES, CONDITIONS))
          .isInstanceOfSatisfying(
              PluginFailure.class,
              failure -> {
                assertThat(failure.finding().subject()).isEqualTo("odd.jar");
                assertThat(failure.finding().sentence()).contains("Plug-in 'odd'").contains(words);
              });
    }
  }

  private PluginSet odd(String members, String body) throws IOException {
    JarWriter.plugin("odd")
        .type("Odd", "load.odd", members, body)
        .services("sample.Odd")
        .write(folder.resolve("odd.jar"));
    return Plugins.load(folder);
  }
}
