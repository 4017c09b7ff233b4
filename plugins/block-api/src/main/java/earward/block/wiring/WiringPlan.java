package earward.block.wiring;

import earward.block.device.Device;
import earward.block.device.Terminal;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Writes a block down from left to right, one part a call. A cursor stands at a node: it begins at
 * the first node of the entry, RUN moves it to the far end, {@link #at} sets it, and all other
 * calls leave it where it is.
 *
 * <pre>{@code
 * Wiring.from(new Single("in"))
 *     .run("couple", Capacitor.of(220e-9, 63), "hot")
 *     .body("track", potentiometer, Map.of(TOP, "hot", BOTTOM, GROUND, WIPER, "wiper"))
 *     .testPoint("wiper", "wiper")
 *     .fit("track", "couple")
 *     .to(new Single("wiper"));
 * }</pre>
 *
 * <p>A node exists as soon as a part touches it. Node and part names are letters, digits and single
 * hyphens, local to the block; {@link Nodes#GROUND} and the rails are shared by the whole kit. A
 * two-ended part is given by the node at its far end; which way round it goes matters for diodes
 * (first terminal ANODE) and electrolytic capacitors (first terminal A, the positive one).
 *
 * <p>A push-pull pair is a {@link #column column} from rail to ground, written from the top, each
 * part with the terminal at its upper end:
 *
 * <pre>{@code
 * .column("upper", npn, COLLECTOR, Map.of(COLLECTOR, MAIN_RAIL, BASE, "up", EMITTER, "middle"))
 * .column("lower", pnp, EMITTER, Map.of(EMITTER, "middle", BASE, "low", COLLECTOR, GROUND))
 * .at("middle").run("output-capacitor", capacitor, "out")
 * }</pre>
 *
 * <p>All methods that add a part throw IllegalArgumentException with one sentence when its name is
 * no name, or when a terminal is not one of its device. Not safe for several threads.
 */
public final class WiringPlan {
  private final Optional<Port> entry;
  private final List<WiredPart> parts = new ArrayList<>();
  private final List<TestPoint> testPoints = new ArrayList<>();
  private final List<String> fittingOrder = new ArrayList<>();
  private final List<PartCaution> cautions = new ArrayList<>();
  private final Map<String, String> offeredRails = new LinkedHashMap<>();
  private Optional<String> cursor;

  WiringPlan(Optional<Port> entry) {
    this.entry = entry;
    this.cursor = entry.map(port -> port.nodes().get(0));
  }

  /** Sets the cursor to a node, which the next part may be the first to touch. */
  public WiringPlan at(String node) {
    cursor = Optional.of(node);
    return this;
  }

  /**
   * A two-ended part along the signal, its first terminal at the cursor; moves the cursor.
   *
   * @param id local name of the part; its words are the text {@code part.ID}
   * @param device what it is
   * @param toNode node at its other end, where the cursor goes
   */
  public WiringPlan run(String id, Device device, String toNode) {
    return run(id, device, device.terminals().get(0), toNode);
  }

  /** A two-ended part along the signal, the named terminal at the cursor; moves the cursor. */
  public WiringPlan run(String id, Device device, Terminal entering, String toNode) {
    twoEnded(id, device, Placement.RUN, entering, here(id), toNode);
    return at(toNode);
  }

  /**
   * A two-ended part from the cursor down, its first terminal up. For a chain: {@code at(toNode)}.
   */
  public WiringPlan down(String id, Device device, String toNode) {
    return down(id, device, device.terminals().get(0), toNode);
  }

  /** A two-ended part from the cursor down, the named terminal at the cursor. */
  public WiringPlan down(String id, Device device, Terminal entering, String toNode) {
    return twoEnded(id, device, Placement.DOWN, entering, here(id), toNode);
  }

  /** A two-ended part from the cursor up to a rail, its first terminal at the cursor. */
  public WiringPlan up(String id, Device device, String toNode) {
    return up(id, device, device.terminals().get(0), toNode);
  }

  /** A two-ended part from the cursor up to a rail, the named terminal at the cursor. */
  public WiringPlan up(String id, Device device, Terminal entering, String toNode) {
    return twoEnded(id, device, Placement.UP, entering, here(id), toNode);
  }

  /**
   * The next part down in a chain from rail to ground beside the signal; the cursor stays.
   *
   * @param id local name of the part
   * @param device what it is
   * @param upper the terminal at its upper end
   * @param nodes the node at each connected terminal
   */
  public WiringPlan column(String id, Device device, Terminal upper, Map<Terminal, String> nodes) {
    return add(new WiredPart(id, device, Placement.COLUMN, upper, nodes));
  }

  /**
   * A symbol that the signal goes through (can, potentiometer, IC), entered at the terminal that
   * stands at the cursor, or else at its first; the cursor stays.
   *
   * @param id local name of the part
   * @param device what it is
   * @param nodes the node at each connected terminal; a terminal left out is not connected
   */
  public WiringPlan body(String id, Device device, Map<Terminal, String> nodes) {
    Terminal entering =
        device.terminals().stream()
            .filter(terminal -> cursor.isPresent() && cursor.get().equals(nodes.get(terminal)))
            .findFirst()
            .or(() -> device.terminals().stream().filter(nodes::containsKey).findFirst())
            .orElseThrow(
                () -> new IllegalArgumentException("body '" + id + "' is connected nowhere"));
    return add(new WiredPart(id, device, Placement.BODY, entering, nodes));
  }

  /**
   * A two-ended part over or under what stands between two nodes (feedback, bootstrap), its first
   * terminal at the first node; the cursor stays.
   */
  public WiringPlan bridge(String id, Device device, String fromNode, String toNode) {
    return twoEnded(id, device, Placement.BRIDGE, device.terminals().get(0), fromNode, toNode);
  }

  /**
   * A node where the builder measures.
   *
   * @param id local name; its words are the text {@code test-point.ID}
   * @param node where it is; where the block has a node named like the test point, that one
   */
  public WiringPlan testPoint(String id, String node) {
    testPoints.add(new TestPoint(id, node));
    return this;
  }

  /** A hazard that belongs to a part; the sheet has the words for it. */
  public WiringPlan caution(String partId, Caution caution) {
    cautions.add(new PartCaution(partId, caution));
    return this;
  }

  /** The next parts in fitting order; fitted parts that are never named come last, as described. */
  public WiringPlan fit(String... partIds) {
    fittingOrder.addAll(List.of(partIds));
    return this;
  }

  /** For a supply: a rail that it offers at a node. */
  public WiringPlan offerRail(String railName, String node) {
    offeredRails.put(railName, node);
    return this;
  }

  /** Ends the description where the signal goes on. */
  public Wiring to(Port exit) {
    return finish(Optional.of(exit));
  }

  /** Ends the description of a block after which nothing comes. */
  public Wiring end() {
    return finish(Optional.empty());
  }

  private Wiring finish(Optional<Port> exit) {
    List<String> order = new ArrayList<>(fittingOrder);
    for (WiredPart part : parts) {
      if (part.device().fitted() && !order.contains(part.id())) {
        order.add(part.id());
      }
    }
    return new Wiring(entry, exit, parts, testPoints, order, cautions, offeredRails);
  }

  private String here(String id) {
    return cursor.orElseThrow(
        () -> new IllegalArgumentException("part '" + id + "' stands nowhere; call at() first"));
  }

  private WiringPlan twoEnded(
      String id, Device device, Placement placement, Terminal entering, String from, String to) {
    List<Terminal> terminals = device.terminals();
    if (terminals.size() != 2) {
      throw new IllegalArgumentException(
          "part '" + id + "' has the terminals " + terminals + "; use body or column");
    }
    Terminal leaving = terminals.get(0) == entering ? terminals.get(1) : terminals.get(0);
    Map<Terminal, String> nodes = new EnumMap<>(Terminal.class);
    nodes.put(entering, from);
    nodes.put(leaving, to);
    return add(new WiredPart(id, device, placement, entering, nodes));
  }

  private WiringPlan add(WiredPart part) {
    parts.add(part);
    return this;
  }
}
