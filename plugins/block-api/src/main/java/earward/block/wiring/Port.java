package earward.block.wiring;

import java.util.HashSet;
import java.util.List;

/**
 * What a block offers to its neighbour, by the nodes at which they meet. The exit of one block and
 * the entry of the next must be of the same kind; a take-off is entered by a {@link Single}.
 */
public sealed interface Port {
  /** The nodes in order: hot; or plus, minus; or plus, tap, minus. */
  List<String> nodes();

  /**
   * One wire against ground.
   *
   * @param hot the node of the wire
   */
  record Single(String hot) implements Port {
    public Single {
      requireSound(List.of(hot));
    }

    @Override
    public List<String> nodes() {
      return List.of(hot);
    }
  }

  /**
   * Two wires, neither of them ground: the output of a bridge.
   *
   * @param plus the node in phase with the signal
   * @param minus the other node
   */
  record Pair(String plus, String minus) implements Port {
    public Pair {
      requireSound(List.of(plus, minus));
    }

    @Override
    public List<String> nodes() {
      return List.of(plus, minus);
    }
  }

  /**
   * Two wires and their middle: a winding with a centre tap, or a stage that drives two halves.
   *
   * @param plus the node in phase with the signal
   * @param tap the middle
   * @param minus the node in opposite phase
   */
  record TappedPair(String plus, String tap, String minus) implements Port {
    public TappedPair {
      requireSound(List.of(plus, tap, minus));
    }

    @Override
    public List<String> nodes() {
      return List.of(plus, tap, minus);
    }
  }

  private static void requireSound(List<String> nodes) {
    nodes.forEach(node -> Names.require(node, "a node of a port"));
    if (new HashSet<>(nodes).size() < nodes.size()) {
      throw new IllegalArgumentException(
          "the wires of a port stand at the nodes "
              + nodes
              + "; wanted a node of its own for each");
    }
  }
}
