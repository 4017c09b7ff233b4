package earward.block.wiring;

import earward.block.device.Device;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;

/**
 * The parts of one block with their nodes and places: what a block type describes. Immutable; made
 * by {@link #from(Port)} or {@link #start()}. Refused, with one sentence, where two parts or two
 * test points share a name or where anything speaks of a part or a node that is not there.
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
    new Soundness(entry, parts)
        .exit(exit)
        .testPoints(testPoints)
        .fittingOrder(fittingOrder)
        .cautions(cautions)
        .offeredRails(offeredRails);
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
