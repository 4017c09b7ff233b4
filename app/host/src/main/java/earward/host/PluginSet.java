package earward.host;

import earward.block.BlockType;
import earward.block.BlockTypes;
import earward.block.check.Finding;
import java.io.IOException;
import java.net.URLClassLoader;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * The block types of all plug-ins that could be loaded, each behind the guard, and what was
 * refused. Immutable and safe for several threads. After {@link #close} its types must not be used.
 */
public final class PluginSet implements BlockTypes, AutoCloseable {
  private final Map<String, BlockType> types;
  private final List<BlockType> inOrder;
  private final List<Plugin> plugins;
  private final List<Finding> refusals;
  private final List<URLClassLoader> loaders;

  private PluginSet(Builder builder) {
    types = new TreeMap<>(builder.types);
    inOrder = List.copyOf(types.values());
    plugins = List.copyOf(builder.plugins);
    refusals = List.copyOf(builder.refusals);
    loaders = List.copyOf(builder.loaders);
  }

  @Override
  public Optional<BlockType> find(String typeId) {
    return Optional.ofNullable(types.get(typeId));
  }

  @Override
  public List<BlockType> all() {
    return inOrder;
  }

  /** The plug-ins that were loaded, in the order of their file names. */
  public List<Plugin> plugins() {
    return plugins;
  }

  /** The plug-in that a block type came from. */
  public Optional<Plugin> pluginOf(String typeId) {
    return plugins.stream().filter(plugin -> plugin.typeIds().contains(typeId)).findFirst();
  }

  /** What was refused and why; the subject of each is the file's name. */
  public List<Finding> refusals() {
    return refusals;
  }

  /**
   * Lets go of the jars.
   *
   * @throws IOException where a jar cannot be closed; the others are closed all the same
   */
  @Override
  public void close() throws IOException {
    IOException failed = null;
    for (URLClassLoader loader : loaders) {
      try {
        loader.close();
      } catch (IOException e) {
        if (failed == null) {
          failed = e;
        } else {
          failed.addSuppressed(e);
        }
      }
    }
    if (failed != null) {
      throw failed;
    }
  }

  /** Gathers what loading finds; one thread only. */
  static final class Builder {
    private final Map<String, BlockType> types = new TreeMap<>();
    private final List<Plugin> plugins = new ArrayList<>();
    private final List<Finding> refusals = new ArrayList<>();
    private final List<URLClassLoader> loaders = new ArrayList<>();

    void refuse(Finding finding) {
      refusals.add(finding);
    }

    Optional<Plugin> pluginOf(String pluginId) {
      return plugins.stream().filter(plugin -> plugin.id().equals(pluginId)).findFirst();
    }

    Optional<Plugin> pluginOffering(String typeId) {
      return plugins.stream().filter(plugin -> plugin.typeIds().contains(typeId)).findFirst();
    }

    void add(Plugin plugin, List<BlockType> guarded, URLClassLoader loader) {
      plugins.add(plugin);
      loaders.add(loader);
      guarded.forEach(type -> types.put(type.id(), type));
    }

    PluginSet build() {
      return new PluginSet(this);
    }
  }
}
