package earward.kit.path;

import earward.block.BlockDescription;
import earward.block.Curve;
import earward.block.check.Check;
import earward.block.check.Finding;
import earward.block.device.Loudspeaker;
import earward.block.device.Terminal;
import earward.block.figure.FigureName;
import earward.block.law.ToneCurve;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port;
import earward.block.wiring.WiredPart;
import earward.block.wiring.Wiring;
import earward.engine.Circuit;
import earward.engine.CircuitPart;
import earward.engine.FrontEnd;
import earward.engine.Probe;
import earward.engine.Seam;
import earward.kit.design.FrontEndCircuits;
import earward.kit.design.KitConditions;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * Makes the one circuit of placed blocks: parts on global nodes, seams where blocks of the path
 * meet, and a probe for every place by which a voltage may be asked for.
 */
final class CircuitBuilder {
  /** The place of the path's end in figures. */
  static final String PATH = "path";

  private final List<PlacedBlock> path;
  private final List<PlacedBlock> beside;
  private final TestPoints testPoints;
  private final List<Finding> findings = new ArrayList<>();
  private final List<Seam> seams = new ArrayList<>();
  private final Map<String, Probe> probes = new LinkedHashMap<>();

  CircuitBuilder(List<PlacedBlock> path, List<PlacedBlock> beside, TestPoints testPoints) {
    this.path = path;
    this.beside = beside;
    this.testPoints = testPoints;
  }

  List<Finding> findings() {
    return findings;
  }

  Circuit build(KitConditions conditions) {
    List<CircuitPart> parts = new ArrayList<>();
    Stream.concat(path.stream(), beside.stream()).forEach(block -> addParts(block, parts));
    testPoints.nodes().forEach((place, node) -> probe(place, node, Nodes.GROUND));
    for (int i = 1; i < path.size(); i++) {
      join(path.get(i - 1), path.get(i));
    }
    path.forEach(block -> wiring(block).exit().ifPresent(port -> probe(block.id(), block, port)));
    Stream.concat(path.stream(), beside.stream()).forEach(this::probeNamedPlaces);
    if (!path.isEmpty()) {
      probePath(path.get(path.size() - 1));
    }
    return new Circuit(
        parts,
        seams,
        List.copyOf(probes.values()),
        frontEnd(conditions),
        conditions
            .wanted()
            .curve()
            .orElseGet(() -> ToneCurve.lowPass(conditions.core().highestToneHertz())));
  }

  private static FrontEnd frontEnd(KitConditions conditions) {
    if (conditions.circuits().isPresent()) {
      FrontEndCircuits circuits = conditions.circuits().get();
      return new FrontEnd.TunedCircuits(circuits.number(), circuits.quality());
    }
    return new FrontEnd.Points(
        conditions.sidebands().stream()
            .map(point -> new FrontEnd.Point(point.offsetHertz(), point.decibels()))
            .toList());
  }

  private static Wiring wiring(PlacedBlock block) {
    return block.description().wiring();
  }

  private static void addParts(PlacedBlock block, List<CircuitPart> into) {
    for (WiredPart part : wiring(block).parts()) {
      Map<Terminal, String> nodes = new EnumMap<>(Terminal.class);
      part.nodes().forEach((terminal, local) -> nodes.put(terminal, block.globalNode(local)));
      into.add(new CircuitPart(block.partName(part), part.device(), nodes));
    }
  }

  private void join(PlacedBlock left, PlacedBlock right) {
    Optional<Port> out = wiring(left).exit();
    Optional<Port> in = wiring(right).entry();
    if (out.isEmpty()) {
      findings.add(PathFindings.noPort(left, true));
    } else if (in.isEmpty()) {
      findings.add(PathFindings.noPort(right, false));
    } else if (out.get().getClass() != in.get().getClass()) {
      findings.add(PathFindings.portMismatch(left, right, out.get(), in.get()));
    } else {
      addSeams(left, right, out.get(), in.get());
    }
  }

  private void addSeams(PlacedBlock left, PlacedBlock right, Port out, Port in) {
    List<String> suffixes = suffixes(in);
    for (int i = 0; i < suffixes.size(); i++) {
      seams.add(
          new Seam(
              right.id() + suffixes.get(i),
              left.globalNode(out.nodes().get(i)),
              right.globalNode(in.nodes().get(i))));
    }
    probe("seam." + right.id(), right, in);
  }

  /** What follows the block's id in the name of each of a port's seams. */
  static List<String> suffixes(Port port) {
    if (port instanceof Port.Single) {
      return List.of("");
    }
    return port instanceof Port.Pair
        ? List.of(".plus", ".minus")
        : List.of(".plus", ".tap", ".minus");
  }

  private void probe(String name, PlacedBlock block, Port port) {
    List<String> nodes = port.nodes();
    String last = nodes.size() == 1 ? Nodes.GROUND : block.globalNode(nodes.get(nodes.size() - 1));
    probe(name, block.globalNode(nodes.get(0)), last);
  }

  private void probe(String name, String plus, String minus) {
    probes.putIfAbsent(name, new Probe(name, plus, minus));
  }

  /** A probe for each local node that a check or a curve names under another name than its own. */
  private void probeNamedPlaces(PlacedBlock block) {
    BlockDescription description = block.description();
    Stream.concat(
            description.checks().stream().map(Check::figure),
            description.curves().stream().map(Curve::figures).flatMap(List::stream))
        .map(FigureName::place)
        .forEach(
            place -> {
              String node = block.globalNodes().get(place);
              String name = block.id() + "." + place;
              if (node != null && !node.equals(name)) {
                probe(name, node, Nodes.GROUND);
              }
            });
  }

  private void probePath(PlacedBlock last) {
    List<WiredPart> loudspeakers = wiring(last).partsOf(Loudspeaker.class);
    if (!loudspeakers.isEmpty()) {
      WiredPart loudspeaker = loudspeakers.get(0);
      probe(
          PATH,
          last.globalNode(loudspeaker.node(Terminal.A)),
          last.globalNode(loudspeaker.node(Terminal.B)));
      return;
    }
    wiring(last).exit().or(() -> wiring(last).entry()).ifPresent(port -> probe(PATH, last, port));
  }
}
