package earward.host;

import java.nio.file.Path;
import java.util.List;
import java.util.Objects;

/**
 * A plug-in that was loaded.
 *
 * @param id what its manifest calls it
 * @param version of the plug-in
 * @param jar its file
 * @param typeIds the block types that are used from it, in the order of its service file; empty
 *     where each of them was refused
 */
public record Plugin(String id, String version, Path jar, List<String> typeIds) {
  public Plugin {
    Objects.requireNonNull(id);
    Objects.requireNonNull(version);
    Objects.requireNonNull(jar);
    typeIds = List.copyOf(typeIds);
  }
}
