package earward.host;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.BlockType;
import earward.block.check.Finding;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Every bad jar lies between two good ones, which must go on working. */
class PluginsTest {
  @TempDir Path folder;
  private final List<PluginSet> opened = new java.util.ArrayList<>();

  @BeforeEach
  void goodNeighbours() throws IOException {
    JarWriter.plugin("first")
        .soundType("First", "load.first")
        .services("sample.First")
        .write(folder.resolve("a-first.jar"));
    JarWriter.plugin("last")
        .soundType("Last", "load.last")
        .services("sample.Last")
        .write(folder.resolve("z-last.jar"));
  }

  @AfterEach
  void close() throws IOException {
    for (PluginSet set : opened) {
      set.close();
    }
  }

  @Test
  void aCorruptJarIsNamed() throws IOException {
    Files.writeString(folder.resolve("bad.jar"), "no jar at all");
    assertRefused("plugin-unreadable", "bad.jar");
  }

  @Test
  void anEmptyFileIsNamed() throws IOException {
    Files.createFile(folder.resolve("bad.jar"));
    assertRefused("plugin-unreadable", "bad.jar");
  }

  @Test
  void aJarCutShortIsNamed() throws IOException {
    Path whole = sound("half").write(folder.resolve("bad.jar"));
    byte[] bytes = Files.readAllBytes(whole);
    Files.write(whole, java.util.Arrays.copyOf(bytes, bytes.length / 2));
    assertRefused("plugin-unreadable", "bad.jar");
  }

  @Test
  void aFolderThatIsCalledAJarIsNamed() throws IOException {
    Files.createDirectory(folder.resolve("bad.jar"));
    assertRefused("plugin-unreadable", "bad.jar");
  }

  @Test
  void aMissingManifestIsNamed() throws IOException {
    sound("bad").withoutManifest().write(folder.resolve("bad.jar"));
    assertRefused("plugin-manifest", "bad.jar");
  }

  @Test
  void eachMissingAttributeIsNamed() throws IOException {
    for (String name : List.of("Block-Api-Version", "Plugin-Id", "Plugin-Version")) {
      sound("bad").without(name).write(folder.resolve("bad.jar"));
      assertRefused("plugin-manifest", name);
    }
  }

  @Test
  void anotherApiVersionIsRefusedWithBothVersions() throws IOException {
    sound("bad").attribute("Block-Api-Version", "7").write(folder.resolve("bad.jar"));
    assertRefused("plugin-api-version", "bad.jar", "block-api 7", "offers 1");
  }

  @Test
  void noClassIsLoadedFromAJarOfAnotherApiVersion() throws IOException {
    System.clearProperty("earward.host.test.loaded");
    String trap = "static { System.setProperty(\"earward.host.test.loaded\", \"yes\"); }";
    JarWriter jar =
        JarWriter.plugin("bad").type("Bad", "load.bad", trap, "").services("sample.Bad");
    jar.attribute("Block-Api-Version", "7").write(folder.resolve("bad.jar"));
    assertRefused("plugin-api-version", "bad.jar");
    assertThat(System.getProperty("earward.host.test.loaded")).isNull();
    jar.attribute("Block-Api-Version", "1").write(folder.resolve("bad.jar"));
    load();
    assertThat(System.clearProperty("earward.host.test.loaded")).isEqualTo("yes");
  }

  @Test
  void aMissingServiceFileIsNamed() throws IOException {
    JarWriter.plugin("bad").soundType("Bad", "load.bad").write(folder.resolve("bad.jar"));
    assertRefused("plugin-no-service-file", "bad.jar");
  }

  @Test
  void anEmptyServiceFileIsNamed() throws IOException {
    JarWriter.plugin("bad").services().write(folder.resolve("bad.jar"));
    assertRefused("plugin-empty-service-file", "bad.jar");
  }

  @Test
  void aServiceFileThatNamesNoClassOfTheJarIsNamed() throws IOException {
    JarWriter.plugin("bad").services("sample.Absent").write(folder.resolve("bad.jar"));
    assertRefused("plugin-broken", "bad.jar", "sample.Absent");
  }

  @Test
  void aClassThatIsNoBlockTypeIsNamed() throws IOException {
    JarWriter.plugin("bad")
        .source("Plain", "package sample; public class Plain {}")
        .services("sample.Plain")
        .write(folder.resolve("bad.jar"));
    assertRefused("plugin-broken", "bad.jar", "sample.Plain");
  }

  @Test
  void aClassOfANewerJavaIsNamedWithBothVersions() throws IOException {
    sound("bad").java("sample/Sound.class", 99).write(folder.resolve("bad.jar"));
    String here = "runs on Java " + Runtime.version().feature();
    assertRefused("plugin-newer-java", "bad.jar", "wants Java 99", here);
  }

  @Test
  void aThrowingStaticInitialiserIsNamedWithItsReason() throws IOException {
    JarWriter.plugin("bad")
        .type("Bad", "load.bad", "static { if (true) throw new RuntimeException(\"wet\"); }", "")
        .services("sample.Bad")
        .write(folder.resolve("bad.jar"));
    assertRefused("plugin-broken", "bad.jar", "sample.Bad", "wet");
  }

  @Test
  void aThrowingConstructorIsNamedAndItsNeighbourInTheSameJarWorks() throws IOException {
    JarWriter.plugin("bad")
        .type("Bad", "load.bad", "public Bad() { throw new StackOverflowError(\"deep\"); }", "")
        .soundType("Good", "load.good")
        .services("sample.Bad", "sample.Good")
        .write(folder.resolve("bad.jar"));
    PluginSet set = assertRefused("plugin-broken", "bad.jar", "deep");
    assertThat(set.find("load.good")).isPresent();
  }

  @Test
  void aPluginIdBelongsToTheFirstJar() throws IOException {
    sound("first").write(folder.resolve("bad.jar"));
    PluginSet set = assertRefused("plugin-duplicate", "bad.jar", "a-first.jar");
    assertThat(set.find("load.sound")).isEmpty();
  }

  @Test
  void aBlockTypeIdBelongsToTheFirstJar() throws IOException {
    JarWriter.plugin("bad")
        .soundType("Bad", "load.first")
        .services("sample.Bad")
        .write(folder.resolve("bad.jar"));
    PluginSet set = assertRefused("block-duplicate", "bad.jar", "load.first", "a-first.jar");
    assertThat(set.pluginOf("load.first").orElseThrow().id()).isEqualTo("first");
  }

  @Test
  void aBlockTypeIdTwiceInOneJarIsNamed() throws IOException {
    JarWriter.plugin("bad")
        .soundType("One", "load.same")
        .soundType("Two", "load.same")
        .services("sample.One", "sample.Two")
        .write(folder.resolve("bad.jar"));
    PluginSet set = assertRefused("block-duplicate", "bad.jar", "load.same");
    assertThat(set.find("load.same")).isPresent();
  }

  @Test
  void aTypeWithoutAnIdOrWithABadOneIsNamed() throws IOException {
    for (String id : List.of("", "Load One", "load..one")) {
      JarWriter.plugin("bad")
          .soundType("Bad", id)
          .services("sample.Bad")
          .write(folder.resolve("bad.jar"));
      assertRefused("block-id", "sample.Bad");
    }
  }

  @Test
  void aMissingFolderIsAFinding() {
    PluginSet set = load(folder.resolve("nowhere"));
    assertThat(set.all()).isEmpty();
    assertThat(set.refusals()).extracting(Finding::code).containsExactly("plugin-folder");
  }

  @Test
  void jarsAreLoadedInTheOrderOfTheirNames() throws IOException {
    for (String name : List.of("m", "c", "t", "b")) {
      JarWriter.plugin(name)
          .soundType("T" + name, "load." + name)
          .services("sample.T" + name)
          .write(folder.resolve(name + ".jar"));
    }
    PluginSet set = load();
    assertThat(set.plugins())
        .extracting(Plugin::id)
        .containsExactly("first", "b", "c", "m", "t", "last");
    assertThat(set.refusals()).isEmpty();
  }

  private static JarWriter sound(String pluginId) throws IOException {
    return JarWriter.plugin(pluginId).soundType("Sound", "load.sound").services("sample.Sound");
  }

  private PluginSet load() {
    return load(folder);
  }

  private PluginSet load(Path from) {
    PluginSet set = Plugins.load(from);
    opened.add(set);
    return set;
  }

  /** Loads the folder: one refusal of that code whose sentence has those words, neighbours well. */
  private PluginSet assertRefused(String code, String... words) {
    PluginSet set = load();
    assertThat(set.refusals()).extracting(Finding::code).containsExactly(code);
    Finding refusal = set.refusals().get(0);
    assertThat(refusal.subject()).isEqualTo("bad.jar");
    assertThat(refusal.sentence()).contains(words);
    assertThat(set.all()).extracting(BlockType::id).contains("load.first", "load.last");
    BlockType neighbour = set.find("load.last").orElseThrow();
    assertThat(neighbour.describe(GuardTest.NO_VALUES, GuardTest.CONDITIONS).wiring().parts())
        .hasSize(1);
    return set;
  }
}
