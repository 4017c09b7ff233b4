package earward.sheet.internal.gather;

import earward.block.device.AudioAmplifier;
import earward.block.device.Pin;
import earward.block.device.Terminal;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port;
import earward.block.wiring.WiredPart;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.sheet.internal.section.Words;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** What is joined to what, in the words of a builder: references and pins. */
final class Joints {
  private static final int MOST_NAMED = 2;

  private final Words words;
  private final Map<String, String> joined = new HashMap<>();
  private final Map<String, List<End>> ends = new LinkedHashMap<>();

  private record End(String part, String shown) {}

  Joints(Assembly assembly, Words words) {
    this.words = words;
    List<PlacedBlock> path = assembly.path();
    for (int i = 1; i < path.size(); i++) {
      meet(path.get(i - 1), path.get(i));
    }
    for (PlacedBlock block : assembly.blocks()) {
      for (WiredPart part : block.description().wiring().parts()) {
        Optional<String> reference = assembly.references().ofPart(block.partName(part));
        if (part.device().fitted() && reference.isPresent()) {
          part.nodes().keySet().forEach(terminal -> add(block, part, reference.get(), terminal));
        }
      }
    }
  }

  /** Where two blocks meet, the nodes of their ports are one. */
  private void meet(PlacedBlock left, PlacedBlock right) {
    Optional<Port> out = left.description().wiring().exit();
    Optional<Port> in = right.description().wiring().entry();
    if (out.isPresent() && in.isPresent()) {
      List<String> before = out.get().nodes();
      List<String> after = in.get().nodes();
      for (int i = 0; i < Math.min(before.size(), after.size()); i++) {
        join(left.globalNode(before.get(i)), right.globalNode(after.get(i)));
      }
    }
  }

  private void add(PlacedBlock block, WiredPart part, String reference, Terminal terminal) {
    ends.computeIfAbsent(root(block.globalNode(part.node(terminal))), any -> new ArrayList<>())
        .add(new End(block.partName(part), shown(part, reference, terminal)));
  }

  private String shown(WiredPart part, String reference, Terminal terminal) {
    if (part.device() instanceof AudioAmplifier amplifier) {
      Optional<Pin> pin =
          amplifier.pins().stream().filter(p -> p.terminal() == terminal).findFirst();
      if (pin.isPresent()) {
        String number = Integer.toString(pin.get().number());
        return words.text("joint.pin", "part", reference, "pin", number);
      }
    }
    return reference;
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

  /**
   * Where an end of a part leads: ground, a rail, or the first parts that are joined to it; empty
   * where nothing is.
   *
   * @param part whose end it is, by its name in the circuit
   * @param node of the circuit; null for an end that is not connected
   */
  String from(String part, @org.jspecify.annotations.Nullable String node) {
    if (node == null) {
      return "";
    }
    String root = root(node);
    if (root.equals(Nodes.GROUND)) {
      return words.text("joint.ground");
    }
    if (Nodes.isRail(root)) {
      return words.text("joint.rail", "name", root.substring(Nodes.rail("").length()));
    }
    List<String> others =
        ends.getOrDefault(root, List.of()).stream()
            .filter(end -> !end.part().equals(part))
            .map(End::shown)
            .distinct()
            .limit(MOST_NAMED)
            .toList();
    return String.join(", ", others);
  }
}
