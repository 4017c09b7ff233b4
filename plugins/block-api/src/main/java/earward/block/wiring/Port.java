package earward.block.wiring;

import java.util.List;

/** What a block offers to its neighbour, by the nodes at which they meet. */
public sealed interface Port {
  /** The nodes in order: hot; or plus, minus; or plus, tap, minus. */
  List<String> nodes();

  /** One wire against ground. */
  record Single(String hot) implements Port {
    @Override
    public List<String> nodes() {
      return List.of(hot);
    }
  }

  /** Two wires, neither of them ground: the output of a bridge. */
  record Pair(String plus, String minus) implements Port {
    @Override
    public List<String> nodes() {
      return List.of(plus, minus);
    }
  }

  /** Two wires and their middle: a winding with a centre tap, or a stage that drives two halves. */
  record TappedPair(String plus, String tap, String minus) implements Port {
    @Override
    public List<String> nodes() {
      return List.of(plus, tap, minus);
    }
  }
}
