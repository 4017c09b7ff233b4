package earward.kit.path;

import earward.block.BlockTypes;
import earward.block.Role;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port;
import earward.block.wiring.WiredPart;
import earward.engine.Circuit;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.design.ReferenceLetters;
import earward.kit.design.References;
import earward.kit.parts.PartsLibrary;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * Joins the blocks of a design to one circuit. Nothing that is wrong with the design is thrown: it
 * is a finding of the assembly, and a block that cannot be placed keeps its settings in the design.
 */
public final class Assembler {
  private final KitDesign design;
  private final List<Finding> findings = new ArrayList<>();
  private final List<PlacedBlock> path = new ArrayList<>();
  private final List<PlacedBlock> beside = new ArrayList<>();

  private Assembler(KitDesign design) {
    this.design = design;
  }

  /**
   * The assembly of a design.
   *
   * @param design what is to be built
   * @param types the block types at hand
   * @param library the parts that settings may name
   */
  public static Assembly assemble(KitDesign design, BlockTypes types, PartsLibrary library) {
    return new Assembler(design).run(types, library);
  }

  private Assembly run(BlockTypes types, PartsLibrary library) {
    SafetyRules.frontEnd(design).ifPresent(findings::add);
    BlockPlacer placer = new BlockPlacer(types, library, design.conditions().core(), findings);
    if (design.path().isEmpty()) {
      findings.add(PathFindings.emptyPath());
    }
    design.path().forEach(entry -> placer.place(entry).ifPresent(path::add));
    if (path.size() == design.path().size()) {
      findings.addAll(PathOrder.of(path));
    }
    placeBeside(placer, design.supplies(), Role.SUPPLY);
    placeBeside(placer, design.takeOffs(), Role.TAKE_OFF);
    findings.addAll(SafetyRules.supplies(beside));
    checkRails();
    return finish();
  }

  private void placeBeside(BlockPlacer placer, List<BlockEntry> entries, Role wanted) {
    for (BlockEntry entry : entries) {
      Optional<PlacedBlock> placed = placer.place(entry);
      if (placed.isPresent() && placed.get().type().role() != wanted) {
        findings.add(PathFindings.notBeside(placed.get(), wanted));
      } else if (placed.isPresent()) {
        beside.add(wanted == Role.TAKE_OFF ? joined(placed.get()) : placed.get());
      }
    }
  }

  /** The take-off with its entry node replaced by the node that it hangs on. */
  private PlacedBlock joined(PlacedBlock block) {
    String where = block.entry().joinsAt().orElse("");
    Optional<Port> entry = block.description().wiring().entry();
    if (ofMissingBlock(where)) {
      return block;
    }
    if (!globalNodes().contains(where)) {
      findings.add(PathFindings.joinsNowhere(block, where));
      return block;
    }
    if (entry.isEmpty() || !(entry.get() instanceof Port.Single)) {
      findings.add(PathFindings.noPort(block, false));
      return block;
    }
    Map<String, String> nodes = new HashMap<>(block.globalNodes());
    nodes.put(entry.get().nodes().get(0), where);
    return new PlacedBlock(block.entry(), block.type(), block.values(), block.description(), nodes);
  }

  /** Whether the node is one of a block that could not be placed: that is said already. */
  private boolean ofMissingBlock(String node) {
    return missing().anyMatch(entry -> node.startsWith(entry.id() + "."));
  }

  private Stream<BlockEntry> missing() {
    Set<String> placed = blocks().map(PlacedBlock::id).collect(Collectors.toSet());
    return design.blocks().stream().filter(entry -> !placed.contains(entry.id()));
  }

  private boolean supplyMissing() {
    return missing().anyMatch(design.supplies()::contains);
  }

  private Set<String> globalNodes() {
    Set<String> nodes = new LinkedHashSet<>(Set.of(Nodes.GROUND));
    blocks().forEach(block -> nodes.addAll(block.globalNodes().values()));
    return nodes;
  }

  private Stream<PlacedBlock> blocks() {
    return Stream.concat(path.stream(), beside.stream());
  }

  private void checkRails() {
    Map<String, String> offeredBy = new LinkedHashMap<>();
    for (PlacedBlock block : beside) {
      for (String local : block.description().wiring().offeredRails().values()) {
        String rail = block.globalNode(local);
        String former = offeredBy.put(rail, block.id());
        if (former != null) {
          findings.add(PathFindings.railTwice(block, name(rail), former));
        }
      }
    }
    if (supplyMissing()) {
      return;
    }
    List<String> offered = offeredBy.keySet().stream().map(Assembler::name).toList();
    blocks()
        .forEach(
            block ->
                block.globalNodes().values().stream()
                    .filter(node -> Nodes.isRail(node) && !offeredBy.containsKey(node))
                    .distinct()
                    .forEach(
                        node ->
                            findings.add(PathFindings.railMissing(block, name(node), offered))));
  }

  private static String name(String rail) {
    return rail.substring(Nodes.rail("").length());
  }

  private Assembly finish() {
    TestPoints testPoints = new TestPoints(design, path, beside, globalNodes());
    if (missing().findAny().isEmpty()) {
      findings.addAll(testPoints.findings());
    }
    CircuitBuilder builder = new CircuitBuilder(path, beside, testPoints);
    Circuit circuit = builder.build(design.conditions());
    if (path.size() == design.path().size()) {
      findings.addAll(builder.findings());
    }
    References references = design.references().completed(neededParts(), testPoints.places());
    boolean complete = findings.stream().noneMatch(finding -> finding.severity() == Severity.STOP);
    return new Assembly(
        design,
        path,
        beside,
        circuit,
        testPoints.placed(references),
        references,
        findings,
        complete);
  }

  private List<References.Needed> neededParts() {
    List<References.Needed> needed = new ArrayList<>();
    blocks()
        .forEach(
            block -> {
              for (String id : block.description().wiring().fittingOrder()) {
                WiredPart part = block.description().wiring().part(id).orElseThrow();
                String letters = ReferenceLetters.of(part.device());
                needed.add(new References.Needed(block.partName(id), letters));
              }
            });
    return needed;
  }
}
