package earward.host;

import earward.block.BlockType;
import java.io.IOException;
import java.net.MalformedURLException;
import java.net.URL;
import java.net.URLClassLoader;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.ServiceLoader;

/** Loads the types of one jar that {@link JarCheck} has passed. */
final class PluginLoader {
  /** Service files that keep failing are given up after this many failures. */
  private static final int MOST_FAILURES = 100;

  private PluginLoader() {}

  static void load(JarCheck.Promise promise, PluginSet.Builder set) {
    URL url;
    try {
      url = promise.jar().toUri().toURL();
    } catch (MalformedURLException e) {
      set.refuse(Refusals.unreadable(promise.jar(), e));
      return;
    }
    URLClassLoader loader =
        new URLClassLoader(promise.pluginId(), new URL[] {url}, new NarrowLoader());
    List<BlockType> found = instantiate(promise, loader, set);
    List<BlockType> kept = new ArrayList<>();
    for (BlockType type : found) {
      check(promise, type, kept, set);
    }
    if (kept.isEmpty()) {
      try {
        loader.close();
      } catch (IOException e) {
        set.refuse(Refusals.unreadable(promise.jar(), e));
      }
      return;
    }
    List<String> ids = kept.stream().map(BlockType::id).toList();
    set.add(
        new Plugin(promise.pluginId(), promise.pluginVersion(), promise.jar(), ids), kept, loader);
  }

  @SuppressWarnings("CatchingUnchecked") // whatever a plug-in throws is a finding about it
  private static List<BlockType> instantiate(
      JarCheck.Promise promise, URLClassLoader loader, PluginSet.Builder set) {
    List<BlockType> types = new ArrayList<>();
    Iterator<ServiceLoader.Provider<BlockType>> providers =
        ServiceLoader.load(BlockType.class, loader).stream().iterator();
    int failures = 0;
    while (failures < MOST_FAILURES) {
      String typeName = "";
      try {
        if (!providers.hasNext()) {
          break;
        }
        ServiceLoader.Provider<BlockType> provider = providers.next();
        typeName = provider.type().getName();
        types.add(provider.get());
      } catch (Throwable thrown) {
        Guard.letPass(thrown);
        failures++;
        set.refuse(Refusals.broken(promise, typeName, thrown));
      }
    }
    return types;
  }

  private static void check(
      JarCheck.Promise promise, BlockType type, List<BlockType> kept, PluginSet.Builder set) {
    GuardedType guarded;
    try {
      guarded = GuardedType.of(new Guard(promise.pluginId(), promise.fileName()), type);
    } catch (PluginFailure failure) {
      set.refuse(failure.finding());
      return;
    }
    String id = guarded.id();
    Optional<String> other =
        kept.stream().anyMatch(earlier -> earlier.id().equals(id))
            ? Optional.of(promise.fileName())
            : set.pluginOffering(id).map(plugin -> String.valueOf(plugin.jar().getFileName()));
    if (other.isPresent()) {
      set.refuse(Refusals.duplicateType(promise, id, other.get()));
      return;
    }
    kept.add(guarded);
  }
}
