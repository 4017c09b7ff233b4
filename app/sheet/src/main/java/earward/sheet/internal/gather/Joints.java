package earward.sheet.internal.gather;

import earward.block.device.AudioAmplifier;
import earward.block.device.Pin;
import earward.block.device.Terminal;
import earward.block.wiring.Nodes;
import earward.engine.CircuitPart;
import earward.engine.Seam;
import earward.kit.path.Assembly;
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
    for (Seam seam : assembly.circuit().seams()) {
      join(seam.before(), seam.after());
    }
    for (CircuitPart part : assembly.circuit().parts()) {
      Optional<String> reference = assembly.references().ofPart(part.name());
      if (part.device().fitted() && reference.isPresent()) {
        part.nodes().forEach((terminal, node) -> add(part, reference.get(), terminal, node));
      }
    }
  }

  private void add(CircuitPart part, String reference, Terminal terminal, String node) {
    ends.computeIfAbsent(root(node), any -> new ArrayList<>())
        .add(new End(part.name(), shown(part, reference, terminal)));
  }

  private String shown(CircuitPart part, String reference, Terminal terminal) {
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
