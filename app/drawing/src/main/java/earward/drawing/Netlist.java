package earward.drawing;

import earward.block.wiring.Nodes;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * What is connected to what: for each net the ends that meet there. Immutable.
 *
 * <p>An end is {@code block.part:TERMINAL}, or {@code block#test-point}. Two netlists are compared
 * by {@link #differences}: only ground and rails are compared by name.
 *
 * @param nets by name
 */
public record Netlist(SortedMap<String, SortedSet<String>> nets) {
  public Netlist {
    SortedMap<String, SortedSet<String>> copy = new TreeMap<>();
    nets.forEach(
        (net, ends) -> copy.put(net, Collections.unmodifiableSortedSet(new TreeSet<>(ends))));
    nets = Collections.unmodifiableSortedMap(copy);
  }

  /**
   * The netlist that the descriptions state: nodes of one name are one net, and at a seam the nodes
   * of the left block's exit are those of the right block's entry.
   *
   * @param path blocks in the order of the signal
   * @param beside blocks beside the path
   */
  public static Netlist described(List<SheetBlock> path, List<SheetBlock> beside) {
    return DescribedNets.of(path, beside);
  }

  /**
   * How another netlist differs from this, one sentence each; empty when the same ends are
   * connected. Nets are compared by their ends; ground and rails also by their name.
   */
  public List<String> differences(Netlist other) {
    List<String> found = new ArrayList<>();
    only(this, other).forEach(net -> found.add("missing: " + net));
    only(other, this).forEach(net -> found.add("too much: " + net));
    return found;
  }

  private static Collection<String> only(Netlist these, Netlist those) {
    SortedSet<String> left = signatures(these);
    left.removeAll(signatures(those));
    return left;
  }

  private static SortedSet<String> signatures(Netlist netlist) {
    SortedSet<String> all = new TreeSet<>();
    for (Map.Entry<String, SortedSet<String>> net : netlist.nets.entrySet()) {
      if (!net.getValue().isEmpty()) {
        all.add((Nodes.isShared(net.getKey()) ? net.getKey() + " " : "") + net.getValue());
      }
    }
    return all;
  }
}
