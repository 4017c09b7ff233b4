package earward.kit.path;

import earward.block.check.Finding;
import earward.block.device.Device;
import earward.engine.Circuit;
import earward.kit.design.KitDesign;
import earward.kit.design.References;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * A design whose blocks were joined to one circuit, or the findings that say why they could not be.
 *
 * @param design the design
 * @param path the blocks of the signal path, in order; those that could be described
 * @param beside supplies, then take-offs
 * @param circuit all of it
 * @param testPoints where a builder measures, in the order of the path, the designer's own last
 * @param references of parts and test points, completed
 * @param findings what was found on the way
 * @param complete whether the circuit may be solved: no block is missing and nothing was refused
 */
public record Assembly(
    KitDesign design,
    List<PlacedBlock> path,
    List<PlacedBlock> beside,
    Circuit circuit,
    List<PlacedTestPoint> testPoints,
    References references,
    List<Finding> findings,
    boolean complete) {
  public Assembly {
    Objects.requireNonNull(design);
    path = List.copyOf(path);
    beside = List.copyOf(beside);
    Objects.requireNonNull(circuit);
    testPoints = List.copyOf(testPoints);
    Objects.requireNonNull(references);
    findings = List.copyOf(findings);
  }

  /** All blocks: the path, then supplies, then take-offs. */
  public List<PlacedBlock> blocks() {
    return Stream.concat(path.stream(), beside.stream()).toList();
  }

  /** The block of this id. */
  public Optional<PlacedBlock> block(String id) {
    return blocks().stream().filter(block -> block.id().equals(id)).findFirst();
  }

  /** What each part of the whole circuit is, by its name there ({@code volume.track}), in order. */
  public Map<String, Device> devices() {
    Map<String, Device> devices = new LinkedHashMap<>();
    circuit.parts().forEach(part -> devices.put(part.name(), part.device()));
    return devices;
  }
}
