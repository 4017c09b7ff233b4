package earward.kit.path;

import earward.block.Role;
import earward.block.check.Finding;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Where the roles may stand: a feed first, then a detector, then filters, volume and preamplifiers
 * in any order, then a power stage, then a load. A path may end after any of them.
 */
final class PathOrder {
  private PathOrder() {}

  static List<Finding> of(List<PlacedBlock> path) {
    List<Finding> findings = new ArrayList<>();
    boolean detected = false;
    boolean powered = false;
    boolean loaded = false;
    for (int i = 0; i < path.size(); i++) {
      PlacedBlock block = path.get(i);
      Role role = block.type().role();
      fault(role, i, detected, powered, loaded)
          .ifPresent(wanted -> findings.add(PathFindings.order(block, wanted)));
      detected |= role == Role.DETECTOR;
      powered |= role == Role.POWER;
      loaded |= role == Role.LOAD;
    }
    return findings;
  }

  private static Optional<String> fault(
      Role role, int index, boolean detected, boolean powered, boolean loaded) {
    if (!role.inPath()) {
      return Optional.of("it belongs beside the path, under supplies or take-offs.");
    }
    if (index == 0) {
      return role == Role.FEED ? Optional.empty() : Optional.of("a path begins with a feed.");
    }
    if (loaded) {
      return Optional.of("nothing may stand after the load.");
    }
    return switch (role) {
      case FEED -> Optional.of("a feed can only stand first.");
      case DETECTOR -> detected ? Optional.of("a path has one detector.") : Optional.empty();
      case AUDIO_FILTER, VOLUME, PREAMPLIFIER -> {
        if (!detected) {
          yield Optional.of("it works on audio, so a detector stands before it.");
        }
        yield powered
            ? Optional.of("after the power stage only the load may stand.")
            : Optional.empty();
      }
      case POWER -> {
        if (!detected) {
          yield Optional.of("it works on audio, so a detector stands before it.");
        }
        yield powered ? Optional.of("a path has one power stage.") : Optional.empty();
      }
      case LOAD -> Optional.empty();
      case SUPPLY, TAKE_OFF -> Optional.empty();
    };
  }
}
