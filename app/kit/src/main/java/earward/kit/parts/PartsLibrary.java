package earward.kit.parts;

import earward.block.device.PartKind;
import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The catalogue of known part types, by kind and name. Immutable. */
public final class PartsLibrary {
  /** A library without entries. */
  public static final PartsLibrary EMPTY = new PartsLibrary(List.of());

  private final Map<PartKind, Map<String, PartEntry>> entries = new EnumMap<>(PartKind.class);

  /**
   * A library of these entries.
   *
   * @throws IllegalArgumentException when two entries of a kind have the same name
   */
  public PartsLibrary(List<PartEntry> all) {
    for (PartEntry entry : all) {
      PartEntry former =
          entries
              .computeIfAbsent(entry.model().kind(), kind -> new LinkedHashMap<>())
              .put(entry.model().name(), entry);
      if (former != null) {
        throw new IllegalArgumentException(
            "two parts of kind "
                + entry.model().kind().key()
                + " are named "
                + former.model().name());
      }
    }
  }

  /** The entry of this name, letter by letter as the library has it. */
  public Optional<PartEntry> find(PartKind kind, String name) {
    return Optional.ofNullable(of(kind).get(name));
  }

  /** The names of a kind, in the order of the library. */
  public List<String> names(PartKind kind) {
    return List.copyOf(of(kind).keySet());
  }

  /** All entries, kind by kind. */
  public List<PartEntry> all() {
    List<PartEntry> all = new ArrayList<>();
    entries.values().forEach(ofKind -> all.addAll(ofKind.values()));
    return Collections.unmodifiableList(all);
  }

  private Map<String, PartEntry> of(PartKind kind) {
    return entries.getOrDefault(kind, Map.of());
  }
}
