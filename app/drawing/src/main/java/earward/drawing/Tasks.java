package earward.drawing;

import earward.block.device.Terminal;
import earward.block.wiring.Nodes;
import earward.block.wiring.Placement;
import earward.block.wiring.Port;
import earward.block.wiring.TestPoint;
import earward.block.wiring.WiredPart;
import earward.drawing.internal.place.BlockTask;
import earward.drawing.internal.place.Part;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Stream;

/** Turns block descriptions into what is to be laid out, on the nets of the whole circuit. */
final class Tasks {
  private final List<SheetBlock> path;
  private final List<SheetBlock> beside;
  private final DescribedNets nets;
  private final Map<String, String> flagNames = new TreeMap<>();
  private final Map<SheetBlock, Map<String, String>> flags = new HashMap<>();

  Tasks(List<SheetBlock> path, List<SheetBlock> beside) {
    this.path = path;
    this.beside = beside;
    this.nets = DescribedNets.joining(path);
    findFlags();
  }

  /** What is written at nets that go on elsewhere, by net. */
  Map<String, String> flagNames() {
    return flagNames;
  }

  /** The block's task, its entry at the rows at which the block before it ends. */
  BlockTask task(SheetBlock block, List<Integer> entryGaps) {
    List<Part> parts = new ArrayList<>();
    for (WiredPart part : block.wiring().parts()) {
      Map<Terminal, String> ends = new EnumMap<>(Terminal.class);
      part.nodes().forEach((terminal, node) -> ends.put(terminal, nets.net(block, node)));
      PartLabel label = block.label(part.id());
      parts.add(
          new Part(
              block.id() + "." + part.id(),
              part.device(),
              part.placement(),
              part.entering(),
              ends,
              Stream.of(label.reference(), label.value()).filter(s -> !s.isBlank()).toList()));
    }
    List<BlockTask.Point> points = new ArrayList<>();
    for (TestPoint point : block.wiring().testPoints()) {
      points.add(
          new BlockTask.Point(
              EndNames.ofTestPoint(block.id(), point.id()),
              nets.net(block, point.node()),
              block.flag(point.id())));
    }
    return new BlockTask(
        block.id(),
        block.title(),
        parts,
        entry(block),
        exit(block),
        entryGaps,
        points,
        flags.getOrDefault(block, Map.of()),
        railNames(parts, points),
        railLanes(block, parts));
  }

  private List<String> entry(SheetBlock block) {
    return named(block, block.wiring().entry().map(Port::nodes).orElse(List.of()));
  }

  private List<String> exit(SheetBlock block) {
    return named(block, block.wiring().exit().map(Port::nodes).orElse(List.of()));
  }

  private List<String> named(SheetBlock block, List<String> nodes) {
    return nodes.stream().map(node -> nets.net(block, node)).toList();
  }

  private static Map<String, String> railNames(List<Part> parts, List<BlockTask.Point> points) {
    Map<String, String> names = new HashMap<>();
    Stream<String> all =
        Stream.concat(
            parts.stream().flatMap(part -> part.nets().values().stream()),
            points.stream().map(BlockTask.Point::net));
    all.filter(Nodes::isRail)
        .forEach(rail -> names.put(rail, rail.substring(Nodes.rail("").length())));
    return names;
  }

  /** The rails that the signal of this block runs along: those that it offers or runs through. */
  private Set<String> railLanes(SheetBlock block, List<Part> parts) {
    Set<String> lanes = new LinkedHashSet<>();
    block.wiring().offeredRails().values().forEach(node -> lanes.add(nets.net(block, node)));
    for (Part part : parts) {
      if (part.placement() == Placement.RUN) {
        lanes.addAll(part.nets().values());
      }
    }
    lanes.addAll(entry(block));
    lanes.addAll(exit(block));
    lanes.removeIf(net -> !Nodes.isRail(net));
    return lanes;
  }

  /** Nets that stand in blocks that do not meet at a seam get a flag in each place. */
  private void findFlags() {
    Map<String, List<List<SheetBlock>>> groups = new LinkedHashMap<>();
    SheetBlock before = null;
    for (SheetBlock block : path) {
      SheetBlock last = before;
      for (String net : netsOf(block)) {
        List<List<SheetBlock>> known = groups.computeIfAbsent(net, any -> new ArrayList<>());
        if (last != null && !known.isEmpty() && meet(last, block, net)) {
          known.get(known.size() - 1).add(block);
        } else {
          known.add(new ArrayList<>(List.of(block)));
        }
      }
      before = block;
    }
    for (SheetBlock block : beside) {
      for (String net : netsOf(block)) {
        groups.computeIfAbsent(net, any -> new ArrayList<>()).add(List.of(block));
      }
    }
    groups.forEach(this::flag);
  }

  private void flag(String net, List<List<SheetBlock>> places) {
    if (places.size() < 2) {
      return;
    }
    flagNames.put(net, net);
    for (List<SheetBlock> place : places) {
      SheetBlock block = place.get(0);
      boolean cap = beside.contains(block) && entry(block).contains(net);
      if (!cap) {
        flags.computeIfAbsent(block, any -> new HashMap<>()).put(net, net);
      }
    }
  }

  private boolean meet(SheetBlock left, SheetBlock right, String net) {
    List<String> exit = exit(left);
    List<String> entry = entry(right);
    for (int i = 0; i < Math.min(exit.size(), entry.size()); i++) {
      if (exit.get(i).equals(net) && entry.get(i).equals(net)) {
        return true;
      }
    }
    return false;
  }

  private Set<String> netsOf(SheetBlock block) {
    Set<String> all = new LinkedHashSet<>();
    block
        .wiring()
        .parts()
        .forEach(part -> all.addAll(named(block, List.copyOf(part.nodes().values()))));
    block.wiring().testPoints().forEach(point -> all.add(nets.net(block, point.node())));
    all.addAll(entry(block));
    all.addAll(exit(block));
    all.removeIf(Nodes::isShared);
    return all;
  }
}
