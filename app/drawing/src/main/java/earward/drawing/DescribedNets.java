package earward.drawing;

import earward.block.device.Terminal;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port;
import earward.block.wiring.TestPoint;
import earward.block.wiring.WiredPart;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;

/** The nets that block descriptions state. */
final class DescribedNets {
  private final Map<String, String> joined = new HashMap<>();

  private DescribedNets() {}

  static Netlist of(List<SheetBlock> path, List<SheetBlock> beside) {
    DescribedNets nets = joining(path);
    SortedMap<String, SortedSet<String>> found = new TreeMap<>();
    path.forEach(block -> nets.add(block, found));
    beside.forEach(block -> nets.add(block, found));
    return new Netlist(found);
  }

  /** The nets of a path, joined at its seams. */
  static DescribedNets joining(List<SheetBlock> path) {
    DescribedNets nets = new DescribedNets();
    for (int i = 1; i < path.size(); i++) {
      nets.joinSeam(path.get(i - 1), path.get(i));
    }
    return nets;
  }

  /** The net of a block's node. */
  String net(SheetBlock block, String node) {
    return root(block.globalNode(node));
  }

  private void joinSeam(SheetBlock left, SheetBlock right) {
    List<String> exit = left.wiring().exit().map(Port::nodes).orElse(List.of());
    List<String> entry = right.wiring().entry().map(Port::nodes).orElse(List.of());
    for (int i = 0; i < Math.min(exit.size(), entry.size()); i++) {
      join(left.globalNode(exit.get(i)), right.globalNode(entry.get(i)));
    }
  }

  private void join(String a, String b) {
    String rootA = root(a);
    String rootB = root(b);
    if (!rootA.equals(rootB)) {
      boolean keepB = Nodes.isShared(rootB);
      joined.put(keepB ? rootA : rootB, keepB ? rootB : rootA);
    }
  }

  private String root(String node) {
    String at = node;
    String next = joined.get(at);
    while (next != null) {
      at = next;
      next = joined.get(at);
    }
    return at;
  }

  private void add(SheetBlock block, SortedMap<String, SortedSet<String>> found) {
    for (WiredPart part : block.wiring().parts()) {
      for (Map.Entry<Terminal, String> end : part.nodes().entrySet()) {
        net(found, block, end.getValue()).add(EndNames.of(block.id(), part.id(), end.getKey()));
      }
    }
    for (TestPoint point : block.wiring().testPoints()) {
      net(found, block, point.node()).add(EndNames.ofTestPoint(block.id(), point.id()));
    }
  }

  private SortedSet<String> net(
      SortedMap<String, SortedSet<String>> found, SheetBlock block, String node) {
    return found.computeIfAbsent(net(block, node), any -> new TreeSet<>());
  }
}
