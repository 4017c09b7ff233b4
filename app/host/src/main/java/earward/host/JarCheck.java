package earward.host;

import earward.block.BlockApi;
import earward.block.BlockType;
import earward.block.check.Finding;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Optional;
import java.util.jar.Attributes;
import java.util.jar.JarFile;
import java.util.jar.Manifest;
import java.util.zip.ZipEntry;

/** Looks at a jar before any class of it is loaded. */
final class JarCheck {
  private static final String SERVICE_FILE = "META-INF/services/" + BlockType.class.getName();

  private JarCheck() {}

  /** What a jar says of itself. */
  record Promise(Path jar, String pluginId, String pluginVersion) {
    String fileName() {
      return String.valueOf(jar.getFileName());
    }
  }

  /** Either what the jar promises or why it is refused. */
  record Outcome(Optional<Promise> promise, Optional<Finding> refusal) {
    static Outcome refused(Finding refusal) {
      return new Outcome(Optional.empty(), Optional.of(refusal));
    }
  }

  static Outcome look(Path jar) {
    try (JarFile file = new JarFile(jar.toFile())) {
      Manifest manifest = file.getManifest();
      if (manifest == null) {
        return Outcome.refused(Refusals.noManifest(jar));
      }
      return look(jar, manifest.getMainAttributes(), file);
    } catch (IOException | SecurityException | IllegalArgumentException e) {
      // IllegalArgumentException: an entry name that is not in the charset that the jar claims
      return Outcome.refused(Refusals.unreadable(jar, e));
    }
  }

  private static Outcome look(Path jar, Attributes manifest, JarFile file) throws IOException {
    for (String name :
        new String[] {
          BlockApi.MANIFEST_VERSION, BlockApi.MANIFEST_PLUGIN_ID, BlockApi.MANIFEST_PLUGIN_VERSION
        }) {
      String value = manifest.getValue(name);
      if (value == null || value.isBlank()) {
        return Outcome.refused(Refusals.noAttribute(jar, name));
      }
    }
    String found = manifest.getValue(BlockApi.MANIFEST_VERSION).strip();
    if (!found.equals(BlockApi.VERSION)) {
      return Outcome.refused(Refusals.otherApi(jar, found));
    }
    ZipEntry services = file.getEntry(SERVICE_FILE);
    if (services == null) {
      return Outcome.refused(Refusals.noServiceFile(jar, SERVICE_FILE));
    }
    if (!namesAnything(file, services)) {
      return Outcome.refused(Refusals.emptyServiceFile(jar, SERVICE_FILE));
    }
    String id = manifest.getValue(BlockApi.MANIFEST_PLUGIN_ID).strip();
    String version = manifest.getValue(BlockApi.MANIFEST_PLUGIN_VERSION).strip();
    return new Outcome(Optional.of(new Promise(jar, id, version)), Optional.empty());
  }

  private static boolean namesAnything(JarFile file, ZipEntry services) throws IOException {
    try (BufferedReader lines =
        new BufferedReader(
            new InputStreamReader(file.getInputStream(services), StandardCharsets.UTF_8))) {
      return lines.lines().map(line -> line.replaceFirst("#.*", "")).anyMatch(l -> !l.isBlank());
    }
  }
}
