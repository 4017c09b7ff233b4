package earward.kit.design;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;

/**
 * One block of a design: its type and what the designer has set. A setting that is not named takes
 * the type's usual value. The type need not be installed.
 *
 * @param id unique in the design, lower case with hyphens, for instance {@code volume}
 * @param typeId for instance {@code volume.potentiometer}
 * @param settings by setting id, in the order of the file
 * @param rails by the block's own rail name, the rail of the kit that it takes or offers
 * @param joinsAt for a take-off: the node of the path that it hangs on, {@code detector.out}
 * @param locked ids of the settings that proposals leave alone
 * @param written how the file had it
 */
public record BlockEntry(
    String id,
    String typeId,
    Map<String, SettingEntry> settings,
    Map<String, String> rails,
    Optional<String> joinsAt,
    Set<String> locked,
    AsWritten written) {
  public BlockEntry {
    if (!id.matches("[a-z0-9]+(-[a-z0-9]+)*")) {
      throw new IllegalArgumentException(
          "a block is named '" + id + "'; wanted lower case letters, digits and single hyphens");
    }
    if (typeId.isBlank()) {
      throw new IllegalArgumentException("block '" + id + "' has no type");
    }
    settings = Collections.unmodifiableMap(new LinkedHashMap<>(settings));
    rails = Collections.unmodifiableMap(new LinkedHashMap<>(rails));
    Objects.requireNonNull(joinsAt);
    locked = Collections.unmodifiableSet(new LinkedHashSet<>(locked));
    Objects.requireNonNull(written);
  }

  /** A block of which no setting is locked. */
  public BlockEntry(
      String id,
      String typeId,
      Map<String, SettingEntry> settings,
      Map<String, String> rails,
      Optional<String> joinsAt,
      AsWritten written) {
    this(id, typeId, settings, rails, joinsAt, Set.of(), written);
  }

  /** A new block with usual values. */
  public static BlockEntry of(String id, String typeId) {
    return new BlockEntry(id, typeId, Map.of(), Map.of(), Optional.empty(), AsWritten.NEW);
  }

  /** This block with one setting locked against proposals, or free again. */
  public BlockEntry withLock(String settingId, boolean lock) {
    Set<String> copy = new LinkedHashSet<>(locked);
    if (lock) {
      copy.add(settingId);
    } else {
      copy.remove(settingId);
    }
    return new BlockEntry(id, typeId, settings, rails, joinsAt, copy, written);
  }

  /** This block with one setting changed. */
  public BlockEntry with(String settingId, SettingEntry entry) {
    Map<String, SettingEntry> copy = new LinkedHashMap<>(settings);
    copy.put(settingId, entry);
    return new BlockEntry(id, typeId, copy, rails, joinsAt, locked, written);
  }

  /** This block with one setting changed to words, for instance {@code 4.7 kΩ}. */
  public BlockEntry with(String settingId, String words) {
    return with(settingId, new SettingEntry.Words(words));
  }

  /** This block with one setting back at the type's usual value. */
  public BlockEntry without(String settingId) {
    Map<String, SettingEntry> copy = new LinkedHashMap<>(settings);
    copy.remove(settingId);
    return new BlockEntry(id, typeId, copy, rails, joinsAt, locked, written);
  }

  /** This block taking or offering another rail of the kit. */
  public BlockEntry withRail(String ownName, String kitName) {
    Map<String, String> copy = new LinkedHashMap<>(rails);
    copy.put(ownName, kitName);
    return new BlockEntry(id, typeId, settings, copy, joinsAt, locked, written);
  }

  /** This take-off hanging on a node of the path. */
  public BlockEntry joiningAt(String node) {
    return new BlockEntry(id, typeId, settings, rails, Optional.of(node), locked, written);
  }
}
