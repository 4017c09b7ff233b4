package earward.block.wiring;

import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/** What must hold between the lists of one wiring; each method throws with one sentence. */
final class Soundness {
  private final Set<String> partIds = new TreeSet<>();
  private final Set<String> nodes = new TreeSet<>(Set.of(Nodes.GROUND));

  Soundness(Optional<Port> entry, List<WiredPart> parts) {
    entry.ifPresent(port -> nodes.addAll(port.nodes()));
    for (WiredPart part : parts) {
      if (!partIds.add(part.id())) {
        throw new IllegalArgumentException("two parts are named '" + part.id() + "'");
      }
      nodes.addAll(part.nodes().values());
    }
  }

  Soundness exit(Optional<Port> exit) {
    exit.ifPresent(port -> port.nodes().forEach(node -> requireNode(node, "the exit")));
    return this;
  }

  Soundness testPoints(List<TestPoint> testPoints) {
    Set<String> ids = new HashSet<>();
    for (TestPoint point : testPoints) {
      if (!ids.add(point.id())) {
        throw new IllegalArgumentException("two test points are named '" + point.id() + "'");
      }
      requireNode(point.node(), "test point '" + point.id() + "'");
    }
    return this;
  }

  Soundness fittingOrder(List<String> fittingOrder) {
    Set<String> named = new HashSet<>();
    for (String id : fittingOrder) {
      requirePart(id, "the fitting order");
      if (!named.add(id)) {
        throw new IllegalArgumentException("the fitting order names '" + id + "' twice");
      }
    }
    return this;
  }

  Soundness cautions(List<PartCaution> cautions) {
    cautions.forEach(c -> requirePart(c.partId(), "the caution " + c.caution()));
    return this;
  }

  Soundness offeredRails(Map<String, String> offeredRails) {
    offeredRails.forEach((rail, node) -> requireNode(node, "rail '" + rail + "'"));
    return this;
  }

  private void requirePart(String id, String what) {
    if (!partIds.contains(id)) {
      throw new IllegalArgumentException(
          what + " names '" + id + "', which is no part; there are " + partIds);
    }
  }

  private void requireNode(String node, String what) {
    if (!nodes.contains(node)) {
      throw new IllegalArgumentException(
          what + " stands at node '" + node + "', which no part touches; there are " + nodes);
    }
  }
}
