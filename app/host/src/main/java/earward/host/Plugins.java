package earward.host;

import earward.block.check.Finding;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * The door of the host: loads the plug-ins of a folder. Nothing that is wrong with a plug-in is
 * thrown from here; it is a {@link Finding} of the result, and the other plug-ins still work.
 */
public final class Plugins {
  private Plugins() {}

  /**
   * Loads every file of the folder whose name ends in {@code .jar}, in the order of their names.
   *
   * @param folder where the jars are
   * @return what could be used and what was refused; to be closed by the caller
   */
  public static PluginSet load(Path folder) {
    List<Path> jars = new ArrayList<>();
    Optional<Finding> unreadable = list(folder, jars);
    PluginSet.Builder set = new PluginSet.Builder();
    unreadable.ifPresent(set::refuse);
    jars.sort(Comparator.comparing(jar -> String.valueOf(jar.getFileName())));
    for (Path jar : jars) {
      loadJar(jar, set);
    }
    return set.build();
  }

  private static Optional<Finding> list(Path folder, List<Path> into) {
    if (!Files.isDirectory(folder)) {
      return Optional.of(Refusals.noFolder(folder));
    }
    try (DirectoryStream<Path> jars = Files.newDirectoryStream(folder, "*.jar")) {
      jars.forEach(into::add);
      return Optional.empty();
    } catch (IOException | DirectoryIteratorException | UncheckedIOException e) {
      return Optional.of(Refusals.folderUnreadable(folder, e));
    }
  }

  private static void loadJar(Path jar, PluginSet.Builder set) {
    JarCheck.Outcome outcome = JarCheck.look(jar);
    if (outcome.refusal().isPresent()) {
      set.refuse(outcome.refusal().get());
      return;
    }
    JarCheck.Promise promise = outcome.promise().orElseThrow();
    Optional<Plugin> first = set.pluginOf(promise.pluginId());
    if (first.isPresent()) {
      set.refuse(Refusals.duplicatePlugin(promise, first.get()));
      return;
    }
    PluginLoader.load(promise, set);
  }
}
