package earward.kit.path;

import earward.block.Role;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.wiring.Port;
import earward.kit.design.BlockEntry;
import java.util.List;
import java.util.Locale;

/** The sentences of assembling, in one place. */
final class PathFindings {
  private PathFindings() {}

  private static Finding stop(String code, String subject, String sentence) {
    return Finding.of(Severity.STOP, code, subject, sentence);
  }

  static Finding emptyPath() {
    return stop("path-empty", "path", "The signal path has no block; it begins with a feed.");
  }

  static Finding unknownBlock(BlockEntry entry, List<String> known) {
    return stop(
        "unknown-block",
        entry.id(),
        "Block '"
            + entry.id()
            + "' is of type '"
            + entry.typeId()
            + "', which no plug-in offers; its settings are kept; "
            + (known.isEmpty()
                ? "no plug-in was found at all"
                : "there are " + String.join(", ", known))
            + ".");
  }

  static Finding unknownSetting(BlockEntry entry, String settingId, List<String> known) {
    return Finding.of(
        Severity.NOTE,
        "unknown-setting",
        entry.id() + "." + settingId,
        "Block '"
            + entry.id()
            + "' names the setting '"
            + settingId
            + "', which its type does not have; it is kept and not used; there are "
            + String.join(", ", known)
            + ".");
  }

  /** How the figures of a part were fitted. */
  static Finding fitted(PlacedBlock block, String settingId, String sentence) {
    return Finding.of(Severity.NOTE, "fitted-figures", block.id() + "." + settingId, sentence);
  }

  static Finding setting(BlockEntry entry, String settingId, String code, String sentence) {
    return stop(code, entry.id() + "." + settingId, sentence + ".");
  }

  static Finding refusedSettings(BlockEntry entry, String why) {
    return stop(
        "settings-refused",
        entry.id(),
        "Block '" + entry.id() + "' (" + entry.typeId() + ") refuses its settings: " + why);
  }

  static Finding plugInFailed(BlockEntry entry, Throwable thrown) {
    return stop(
        "plug-in-failed",
        entry.id(),
        "The plug-in of '"
            + entry.typeId()
            + "' failed when block '"
            + entry.id()
            + "' was described: "
            + thrown.getClass().getSimpleName()
            + (thrown.getMessage() == null ? "" : ", " + thrown.getMessage())
            + ".");
  }

  static Finding reservedId(BlockEntry entry) {
    return stop(
        "reserved-name",
        entry.id(),
        "A block is named '" + entry.id() + "', a name that the kit keeps for itself; rename it.");
  }

  static Finding order(PlacedBlock block, String wanted) {
    return stop(
        "path-order",
        block.id(),
        "Block '" + block.id() + "' (" + words(block.type().role()) + ") stands wrong: " + wanted);
  }

  static Finding notBeside(PlacedBlock block, Role wanted) {
    return stop(
        "path-order",
        block.id(),
        "Block '"
            + block.id()
            + "' is a "
            + words(block.type().role())
            + "; it is listed where only a "
            + words(wanted)
            + " may stand.");
  }

  static Finding portMismatch(PlacedBlock left, PlacedBlock right, Port out, Port in) {
    return stop(
        "port-mismatch",
        right.id(),
        "Block '"
            + left.id()
            + "' leaves by "
            + words(out)
            + ", and block '"
            + right.id()
            + "' is entered by "
            + words(in)
            + "; the two do not fit.");
  }

  static Finding noPort(PlacedBlock block, boolean exit) {
    return stop(
        "port-missing",
        block.id(),
        exit
            ? "Block '" + block.id() + "' ends the path; nothing may stand after it."
            : "Block '" + block.id() + "' has no way in; it can only stand first.");
  }

  static Finding joinsNowhere(PlacedBlock block, String where) {
    return stop(
        "take-off-unjoined",
        block.id(),
        "Take-off '"
            + block.id()
            + "' "
            + (where.isEmpty()
                ? "does not say where it joins"
                : "joins at '" + where + "', and no block has such a node")
            + "; wanted 'joins at' with a node such as 'detector.out'.");
  }

  static Finding railMissing(PlacedBlock block, String rail, List<String> offered) {
    return stop(
        "rail-missing",
        block.id(),
        "Block '"
            + block.id()
            + "' takes the rail '"
            + rail
            + "', which no supply offers; "
            + (offered.isEmpty() ? "there is none" : "there are " + String.join(", ", offered))
            + ".");
  }

  static Finding railTwice(PlacedBlock block, String rail, String former) {
    return stop(
        "rail-twice",
        block.id(),
        "Supplies '" + former + "' and '" + block.id() + "' both offer the rail '" + rail + "'.");
  }

  static Finding nodeMissing(String testPointId, String node) {
    return stop(
        "test-point-node",
        "added." + testPointId,
        "Test point '" + testPointId + "' stands on '" + node + "', and no block has such a node.");
  }

  static Finding testPointAmbiguous(PlacedBlock block, String testPointId, String node) {
    return stop(
        "test-point-ambiguous",
        block.id(),
        "The plug-in of '"
            + block.type().id()
            + "' puts test point '"
            + testPointId
            + "' on node '"
            + node
            + "' though another node is called '"
            + testPointId
            + "'.");
  }

  private static String words(Port port) {
    if (port instanceof Port.Single) {
      return "one wire";
    }
    return port instanceof Port.Pair ? "a pair of wires" : "a tapped pair of wires";
  }

  static String words(Role role) {
    return role.name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }
}
