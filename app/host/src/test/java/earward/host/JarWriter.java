package earward.host;

import earward.block.BlockType;
import java.io.IOException;
import java.io.OutputStream;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.jar.Attributes;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import javax.tools.JavaCompiler;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;

/** Compiles block types from text and packs them, well or badly, into a plug-in jar. */
final class JarWriter {
  static final String SERVICE_FILE = "META-INF/services/earward.block.BlockType";

  private final Map<String, String> attributes = new LinkedHashMap<>();
  private final Map<String, byte[]> entries = new TreeMap<>();
  private boolean manifest = true;

  /** A jar with the manifest that the host wants. */
  static JarWriter plugin(String id) {
    JarWriter jar = new JarWriter();
    jar.attributes.put("Block-Api-Version", "1");
    jar.attributes.put("Plugin-Id", id);
    jar.attributes.put("Plugin-Version", "3.1");
    return jar;
  }

  JarWriter attribute(String name, String value) {
    attributes.put(name, value);
    return this;
  }

  JarWriter without(String name) {
    attributes.remove(name);
    return this;
  }

  JarWriter withoutManifest() {
    manifest = false;
    return this;
  }

  JarWriter entry(String name, String text) {
    entries.put(name, text.getBytes(StandardCharsets.UTF_8));
    return this;
  }

  JarWriter services(String... classNames) {
    return entry(SERVICE_FILE, "# block types\n" + String.join("\n", classNames) + "\n");
  }

  /** A sound resistor block in package {@code sample}. */
  JarWriter soundType(String className, String typeId) throws IOException {
    return type(className, typeId, "", "");
  }

  /** A resistor block with something added to its class or put before its description. */
  JarWriter type(String className, String typeId, String members, String beforeDescription)
      throws IOException {
    return source(
        className,
        """
        package sample;
        import earward.block.*;
        import earward.block.device.*;
        import earward.block.setting.*;
        import earward.block.wiring.*;
        import java.util.*;
        public class %s implements BlockType {
          public String id() { return "%s"; }
          public Role role() { return Role.LOAD; }
          public List<Setting> settings() { return List.of(); }
          public BlockDescription describe(Values values, Conditions conditions) {
            %s
            return BlockDescription.of(
                Wiring.from(new Port.Single("in"))
                    .down("load", new Resistor(8, 1), Nodes.GROUND).end());
          }
          %s
        }
        """
            .formatted(className, typeId, beforeDescription, members));
  }

  /** Compiles a source against block-api and the JDK and adds its classes. */
  JarWriter source(String className, String text) throws IOException {
    Path work = Files.createTempDirectory("jar-writer");
    Path file = work.resolve(className + ".java");
    Files.writeString(file, text);
    Path classes = Files.createDirectory(work.resolve("classes"));
    JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
    StringWriter messages = new StringWriter();
    try (StandardJavaFileManager files =
        compiler.getStandardFileManager(null, null, StandardCharsets.UTF_8)) {
      String api =
          Path.of(
                  java.net.URI.create(
                      BlockType.class
                          .getProtectionDomain()
                          .getCodeSource()
                          .getLocation()
                          .toString()))
              .toString();
      List<String> options =
          List.of("-proc:none", "-nowarn", "-classpath", api, "-d", classes.toString());
      if (!compiler
          .getTask(messages, files, null, options, null, files.getJavaFileObjects(file))
          .call()) {
        throw new AssertionError("the test's own source does not compile:\n" + messages);
      }
    }
    try (Stream<Path> found = Files.walk(classes)) {
      for (Path path : found.filter(Files::isRegularFile).toList()) {
        entries.put(
            classes.relativize(path).toString().replace('\\', '/'), Files.readAllBytes(path));
      }
    }
    return this;
  }

  /** Gives a class the class file version of another Java. */
  JarWriter java(String entry, int feature) {
    byte[] bytes = entries.get(entry);
    bytes[6] = 0;
    bytes[7] = (byte) (feature + 44);
    return this;
  }

  Path write(Path jar) throws IOException {
    Manifest lines = new Manifest();
    lines.getMainAttributes().put(Attributes.Name.MANIFEST_VERSION, "1.0");
    attributes.forEach((name, value) -> lines.getMainAttributes().putValue(name, value));
    try (OutputStream out = Files.newOutputStream(jar);
        JarOutputStream packed =
            manifest ? new JarOutputStream(out, lines) : new JarOutputStream(out)) {
      for (Map.Entry<String, byte[]> entry : entries.entrySet()) {
        packed.putNextEntry(new ZipEntry(entry.getKey()));
        packed.write(entry.getValue());
        packed.closeEntry();
      }
    }
    return jar;
  }
}
