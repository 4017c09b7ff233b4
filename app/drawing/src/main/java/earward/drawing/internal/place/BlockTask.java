package earward.drawing.internal.place;

import earward.block.device.Terminal;
import earward.block.wiring.Nodes;
import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * One block to be laid out.
 *
 * @param id of the block
 * @param title written above it
 * @param parts in the order of the drawing
 * @param entry the nets of its entry, in the order of the port
 * @param exit the nets of its exit
 * @param entryGaps rows of the entry's wires below its first, in cells
 * @param points its test points
 * @param flags the names under which nets of it go on elsewhere, by net
 * @param railNames what is written at each rail, by net
 * @param lanes rails that are drawn as a wire of their own here rather than as a mark at each end
 */
public record BlockTask(
    String id,
    String title,
    List<Part> parts,
    List<String> entry,
    List<String> exit,
    List<Integer> entryGaps,
    List<Point> points,
    Map<String, String> flags,
    Map<String, String> railNames,
    Set<String> lanes) {

  /**
   * A test point.
   *
   * @param key {@code block#test-point}
   * @param net where it stands
   * @param text of its flag
   */
  public record Point(String key, String net, String text) {}

  public BlockTask {
    parts = List.copyOf(parts);
    entry = List.copyOf(entry);
    exit = List.copyOf(exit);
    entryGaps = List.copyOf(entryGaps);
    points = List.copyOf(points);
    // in one order always, so that the same circuit gives the same drawing
    flags = Collections.unmodifiableMap(new TreeMap<>(flags));
    railNames = Collections.unmodifiableMap(new TreeMap<>(railNames));
    lanes = Collections.unmodifiableSet(new TreeSet<>(lanes));
  }

  /** The nets that could be split: all but ground and rails. */
  public Set<String> splittable() {
    Set<String> nets = new TreeSet<>();
    parts.forEach(part -> nets.addAll(part.nets().values()));
    nets.addAll(entry);
    nets.addAll(exit);
    nets.removeIf(Nodes::isShared);
    return nets;
  }

  /** The same with some nets not drawn as wires: each end of them bears a flag with the name. */
  public BlockTask split(Set<String> nets) {
    return new Splitting(nets).of(this);
  }

  /** Gives each end of a net a net of its own; used once. */
  private static final class Splitting {
    private final Set<String> split;
    private final Map<String, String> flags = new HashMap<>();

    Splitting(Set<String> split) {
      this.split = split;
    }

    BlockTask of(BlockTask task) {
      List<Part> parts = new ArrayList<>();
      for (Part part : task.parts) {
        Map<Terminal, String> nets = new EnumMap<>(Terminal.class);
        part.nets().forEach((end, net) -> nets.put(end, own(net)));
        parts.add(
            new Part(
                part.key(), part.device(), part.placement(), part.entering(), nets, part.label()));
      }
      List<String> entry = task.entry.stream().map(this::own).toList();
      List<String> exit = task.exit.stream().map(this::own).toList();
      List<Point> points =
          task.points.stream().map(p -> new Point(p.key(), own(p.net()), p.text())).toList();
      task.flags.forEach(
          (net, name) -> {
            if (!split.contains(net)) {
              flags.put(net, name);
            }
          });
      return new BlockTask(
          task.id,
          task.title,
          parts,
          entry,
          exit,
          task.entryGaps,
          points,
          flags,
          task.railNames,
          task.lanes);
    }

    private String own(String net) {
      if (!split.contains(net)) {
        return net;
      }
      String name = net + "/" + flags.size();
      flags.put(name, net);
      return name;
    }
  }
}
