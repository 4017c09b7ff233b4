package earward.dist;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.DisabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The shipped folder, started as a process from a place of which the build knows nothing. */
@DisabledOnOs(value = OS.WINDOWS, disabledReason = "bin/earward is the start script for the others")
class StartIT {
  private static final Path BUILT = Path.of(Objects.requireNonNull(property("earward.folder")));
  private static final List<String> ROLES =
      List.of("feed.", "detector.", "filter.", "volume.", "power.", "supply.", "load.");

  @TempDir Path elsewhere;
  private Path program;

  /** What a process left behind. */
  private record Ended(int code, String out, String err) {}

  @BeforeEach
  void copyToAPathWithSpaces() throws IOException {
    program = elsewhere.resolve("Radio Club, kits 50% $HOME #1").resolve("ear ward");
    try (Stream<Path> files = Files.walk(BUILT)) {
      for (Path file : files.toList()) {
        Path to = program.resolve(BUILT.relativize(file).toString());
        Files.createDirectories(Objects.requireNonNull(to.getParent()));
        Files.copy(
            file, to, StandardCopyOption.COPY_ATTRIBUTES, StandardCopyOption.REPLACE_EXISTING);
      }
    }
  }

  @Test
  void theVersionIsTheBuildsOwn() throws Exception {
    Ended ended = start(program.resolve("bin/earward"), elsewhere, Map.of(), "--version");
    assertThat(ended).isEqualTo(new Ended(0, "earward " + property("earward.version") + "\n", ""));
  }

  @Test
  void everyPluginOfOursLoadsAndEveryRoleIsServed() throws Exception {
    Ended ended = start(program.resolve("bin/earward"), elsewhere, Map.of(), "blocks");
    assertThat(ended.code()).isZero();
    assertThat(ended.err()).isEmpty();
    assertThat(ended.out()).doesNotContain("WEIGH", "STOP").contains(ROLES);
    for (Path jar : jars(program.resolve("plugins"))) {
      String id = String.valueOf(jar.getFileName()).replaceFirst("earward-(.*)-[0-9].*", "$1");
      assertThat(ended.out()).contains("earward." + id);
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void aStarterKitBecomesASheetWithItsNameAndKeyFigures(String kit) throws Exception {
    Path sheet = elsewhere.resolve("sheet of " + kit + ".pdf");
    Ended ended = sheet(kit, sheet);
    assertThat(ended.code()).as(ended.err()).isZero();
    assertThat(ended.out()).contains(sheet.getFileName().toString()).contains(" mA", " %");
    assertThat(Files.readAllBytes(sheet)).startsWith("%PDF-".getBytes(StandardCharsets.US_ASCII));
  }

  /** Some sets and maps of the JDK change their order from one process to the next. */
  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void everyProcessMakesTheSameSheetOutOfTheSameDesign(String kit) throws Exception {
    Set<String> sheets = new HashSet<>();
    for (int i = 0; i < 3; i++) {
      Path sheet = elsewhere.resolve(i + ".pdf");
      assertThat(sheet(kit, sheet).code()).isZero();
      MessageDigest digest = MessageDigest.getInstance("SHA-256");
      sheets.add(HexFormat.of().formatHex(digest.digest(Files.readAllBytes(sheet))));
    }
    assertThat(sheets).hasSize(1);
  }

  @Test
  void aMissingDesignIsSaidInOneSentence() throws Exception {
    Ended ended =
        start(program.resolve("bin/earward"), elsewhere, Map.of(), "sheet", "no such.earward");
    assertThat(ended.code()).isEqualTo(2);
    assertThat(ended.out()).isEmpty();
    assertThat(ended.err()).contains("no such.earward").hasLineCount(1);
  }

  @Test
  void aCorruptPluginIsNamedAndItsNeighboursStillWork() throws Exception {
    Files.writeString(program.resolve("plugins/broken.jar"), "no jar");
    Ended ended = start(program.resolve("bin/earward"), elsewhere, Map.of(), "blocks");
    assertThat(ended.code()).isZero();
    assertThat(ended.out()).contains("broken.jar").contains(ROLES);
  }

  @Test
  void itStartsThroughAChainOfLinks() throws Exception {
    Path first = elsewhere.resolve("first link");
    Files.createSymbolicLink(first, program.resolve("bin/earward"));
    Path second = Files.createDirectory(elsewhere.resolve("bin dir")).resolve("earward");
    Files.createSymbolicLink(second, Path.of("..", "first link"));
    assertThat(start(second, Path.of("/"), Map.of(), "--version").out()).startsWith("earward ");
  }

  @Test
  void itStartsByARelativePathWithCdpathSet() throws Exception {
    Path inside = program.resolve("bin");
    Map<String, String> environment = Map.of("CDPATH", "/tmp:/");
    assertThat(start(Path.of("./earward"), inside, environment, "--version").out())
        .startsWith("earward ");
  }

  @Test
  void aFileNameBeyondAsciiIsReadInThePlainestLocaleToo() throws Exception {
    // through a shell, since this test may itself run where Java cannot say such a name
    Path call = elsewhere.resolve("call.sh");
    Files.writeString(
        call,
        """
        cp "$1/templates/kits/lantern.earward" K\u00eft.earward
        exec "$1/bin/earward" review K\u00eft.earward
        """);
    Map<String, String> environment = Map.of("LC_ALL", "C", "LANG", "C");
    Ended ended =
        start(Path.of("/bin/sh"), elsewhere, environment, call.toString(), program.toString());
    assertThat(ended.err()).isEmpty();
    assertThat(ended.code()).isZero();
  }

  @Test
  void anUnknownCommandIsTheCallsFault() throws Exception {
    Ended ended = start(program.resolve("bin/earward"), elsewhere, Map.of(), "no-such-command");
    assertThat(ended.code()).isEqualTo(2);
    assertThat(ended.out()).isEmpty();
    assertThat(ended.err()).isNotBlank().doesNotContain("\tat ");
  }

  @Test
  void aMissingJavaIsSaidInOneSentence() throws Exception {
    Map<String, String> environment = Map.of("JAVA_HOME", "/nowhere at all");
    Ended ended = start(program.resolve("bin/earward"), elsewhere, environment, "--version");
    assertThat(ended.code()).isEqualTo(2);
    assertThat(ended.err()).contains("/nowhere at all/bin/java").contains("Java 17");
  }

  @Test
  void pluginsComeFromTheirFolderAndNotFromTheClassPath() throws IOException {
    assertThat(jars(program.resolve("plugins"))).hasSizeGreaterThanOrEqualTo(8);
    List<String> libraries =
        jars(program.resolve("lib")).stream().map(jar -> jar.getFileName().toString()).toList();
    assertThat(libraries).hasSizeGreaterThan(10);
    for (Path jar : jars(program.resolve("plugins"))) {
      assertThat(libraries).doesNotContain(jar.getFileName().toString());
    }
    assertThat(libraries)
        .noneMatch(name -> name.matches(".*(junit|assertj|testkit|archunit|jmh|timing).*"));
  }

  @Test
  void theFolderHoldsWhatItPromises() {
    for (String name : List.of("LICENSE", "bin/earward.bat", "lib", "plugins", "templates")) {
      assertThat(program.resolve(name)).exists();
    }
    assertThat(program.resolve("bin/earward")).isExecutable();
  }

  @Test
  void aPathThatJavaCannotStartFromIsSaidInOneSentence() throws Exception {
    Path colon = Files.move(program, elsewhere.resolve("kits:2"));
    Ended ended = start(colon.resolve("bin/earward"), elsewhere, Map.of(), "--version");
    assertThat(ended.code()).isEqualTo(2);
    assertThat(ended.out()).isEmpty();
    assertThat(ended.err()).contains("':'").contains("kits:2").hasLineCount(1);
  }

  private static List<Path> jars(Path folder) throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.filter(file -> file.toString().endsWith(".jar")).toList();
    }
  }

  private static String property(String name) {
    return System.getProperty(name);
  }

  private Ended sheet(String kit, Path to) throws IOException, InterruptedException {
    Path design = program.resolve("templates/kits").resolve(kit + ".earward");
    Path script = program.resolve("bin/earward");
    return start(
        script, elsewhere, Map.of(), "sheet", design.toString(), "-o", to.getFileName().toString());
  }

  private Ended start(Path script, Path from, Map<String, String> environment, String... arguments)
      throws IOException, InterruptedException {
    List<String> call = new ArrayList<>(List.of(script.toString()));
    call.addAll(List.of(arguments));
    Path out = elsewhere.resolve("out.txt");
    Path err = elsewhere.resolve("err.txt");
    ProcessBuilder builder =
        new ProcessBuilder(call)
            .directory(from.toFile())
            .redirectOutput(out.toFile())
            .redirectError(err.toFile());
    builder.environment().remove("JAVA_TOOL_OPTIONS");
    builder.environment().putAll(environment);
    Process process = builder.start();
    if (!process.waitFor(60, TimeUnit.SECONDS)) {
      process.destroyForcibly();
      throw new AssertionError("still running after a minute: " + call);
    }
    return new Ended(
        process.exitValue(),
        Files.readString(out, StandardCharsets.UTF_8),
        Files.readString(err, StandardCharsets.UTF_8));
  }
}
