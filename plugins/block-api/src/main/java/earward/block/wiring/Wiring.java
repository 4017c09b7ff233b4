package earward.block.wiring;

import earward.block.device.Device;
import java.util.Collections;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;

/**
 * The parts of one block with their nodes and places: what a block type describes. Immutable; made
 * by {@link #from(Port)} or {@link #start()}.
 *
 * @param entry where the signal comes in; empty for a feed or a supply
 * @param exit where it goes out; empty for an end of the path, a supply or a take-off
 * @param parts in the order of the drawing
 * @param testPoints where the builder measures
 * @param fittingOrder the ids of all fitted parts
 * @param cautions hazards that belong to parts
 * @param offeredRails for a supply: the rails it offers (by name) and the node of each
 */
public record Wiring(
    Optional<Port> entry,
    Optional<Port> exit,
    List<WiredPart> parts,
    List<TestPoint> testPoints,
    List<String> fittingOrder,
    List<PartCaution> cautions,
    Map<String, String> offeredRails) {

  public Wiring {
    Objects.requireNonNull(entry);
    Objects.requireNonNull(exit);
    parts = List.copyOf(parts);
    testPoints = List.copyOf(testPoints);
    fittingOrder = List.copyOf(fittingOrder);
    cautions = List.copyOf(cautions);
    offeredRails = Collections.unmodifiableMap(new LinkedHashMap<>(offeredRails));
    requireSound(parts, fittingOrder, entry, exit, testPoints);
  }

  private static void requireSound(
      List<WiredPart> parts,
      List<String> fittingOrder,
      Optional<Port> entry,
      Optional<Port> exit,
      List<TestPoint> testPoints) {
    Set<String> ids = new HashSet<>();
    Set<String> nodes = new HashSet<>(Set.of(Nodes.GROUND));
    entry.ifPresent(port -> nodes.addAll(port.nodes()));
    for (WiredPart part : parts) {
      if (!ids.add(part.id())) {
        throw new IllegalArgumentException("two parts are named '" + part.id() + "'");
      }
      nodes.addAll(part.nodes().values());
    }
    exit.ifPresent(port -> port.nodes().forEach(node -> requireNode(nodes, node, "the exit")));
    testPoints.forEach(tp -> requireNode(nodes, tp.node(), "test point '" + tp.id() + "'"));
    for (String id : fittingOrder) {
      if (!ids.contains(id)) {
        throw new IllegalArgumentException("the fitting order names '" + id + "', no part of it");
      }
    }
  }

  private static void requireNode(Set<String> nodes, String node, String what) {
    if (!nodes.contains(node)) {
      throw new IllegalArgumentException(
          what + " stands at node '" + node + "', which no part touches; nodes: " + nodes);
    }
  }

  /** Starts a description whose signal enters at the port. */
  public static WiringPlan from(Port entry) {
    return new WiringPlan(Optional.of(entry));
  }

  /** Starts the description of a block that nothing enters: a feed or a supply. */
  public static WiringPlan start() {
    return new WiringPlan(Optional.empty());
  }

  /** The part of this id. */
  public Optional<WiredPart> part(String id) {
    return parts.stream().filter(part -> part.id().equals(id)).findFirst();
  }

  /** All parts whose device is of the kind. */
  public <D extends Device> List<WiredPart> partsOf(Class<D> kind) {
    return parts.stream().filter(part -> kind.isInstance(part.device())).toList();
  }
}
