package earward.command;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import earward.block.BlockApi;
import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.net.URL;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collections;
import java.util.List;
import java.util.jar.Attributes;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;

/**
 * A runnable folder for tests: the plug-ins of the test class path as jars in {@code plugins/}, and
 * the house's own templates. Made once per test run.
 */
final class TestHome {
  private static final String SERVICE = "META-INF/services/earward.block.BlockType";
  private static final Path HOME = make();

  private TestHome() {}

  static Path path() {
    return HOME;
  }

  static Path starterKit(String name) {
    return HOME.resolve("templates/kits/" + name + ".earward");
  }

  /** An entry of the parts library, as JSON. */
  static String libraryEntry(String file, String part) throws IOException {
    Path library = HOME.resolve("templates/parts/" + file + ".json");
    for (JsonNode entry : new ObjectMapper().readTree(Files.readString(library)).get("parts")) {
      if (entry.get("name").asText().equals(part)) {
        return entry.toString().replace("\":", "\": ");
      }
    }
    throw new AssertionError("no part " + part);
  }

  private static Path make() {
    try {
      Path home = Files.createTempDirectory("earward home ");
      Path plugins = Files.createDirectories(home.resolve("plugins"));
      List<URL> services = Collections.list(TestHome.class.getClassLoader().getResources(SERVICE));
      for (URL service : services) {
        copyPlugin(service, plugins);
      }
      Path templates = Path.of(System.getProperty("basedir", "")).resolve("../../templates");
      copyTree(templates.toAbsolutePath().normalize(), home.resolve("templates"));
      return home;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static void copyPlugin(URL service, Path plugins) throws IOException {
    String text = service.toString();
    try {
      if (text.startsWith("jar:")) {
        URL jar = new URL(text.substring("jar:".length(), text.indexOf("!/")));
        Path from = Path.of(jar.toURI());
        Files.copy(from, plugins.resolve(from.getFileName().toString()));
      } else {
        Path classes = Path.of(service.toURI()).getParent().getParent().getParent();
        String id = classes.getParent().getParent().getFileName().toString();
        writeJar(classes, id, plugins.resolve(id + ".jar"));
      }
    } catch (URISyntaxException e) {
      throw new IOException(e);
    }
  }

  private static void writeJar(Path classes, String id, Path jar) throws IOException {
    Manifest manifest = new Manifest();
    Attributes main = manifest.getMainAttributes();
    main.put(Attributes.Name.MANIFEST_VERSION, "1.0");
    main.putValue(BlockApi.MANIFEST_VERSION, BlockApi.VERSION);
    main.putValue(BlockApi.MANIFEST_PLUGIN_ID, "earward." + id);
    main.putValue(BlockApi.MANIFEST_PLUGIN_VERSION, "0.1.0");
    try (OutputStream out = Files.newOutputStream(jar);
        JarOutputStream zip = new JarOutputStream(out, manifest);
        Stream<Path> files = Files.walk(classes)) {
      for (Path file : files.filter(Files::isRegularFile).sorted().toList()) {
        String name = classes.relativize(file).toString().replace('\\', '/');
        if (!name.equals("META-INF/MANIFEST.MF")) {
          zip.putNextEntry(new ZipEntry(name));
          Files.copy(file, zip);
          zip.closeEntry();
        }
      }
    }
  }

  private static void copyTree(Path from, Path to) throws IOException {
    try (Stream<Path> files = Files.walk(from)) {
      for (Path file : files.filter(Files::isRegularFile).toList()) {
        Path target = to.resolve(from.relativize(file).toString());
        Files.createDirectories(target.getParent());
        Files.copy(file, target);
      }
    }
  }
}
