package earward.block.wiring;

/**
 * The names of nodes that blocks share, in wirings and as places of figures: {@code
 * rail-main:dc-volts@no-signal} is the rail that the block takes. All other node names are local to
 * a block: letters, digits and hyphens.
 */
public final class Nodes {
  /** The common ground of the kit. */
  public static final String GROUND = "ground";

  /** The rail that a supply offers and a stage takes unless the design says otherwise. */
  public static final String MAIN_RAIL = rail("main");

  private static final String RAIL_PREFIX = "rail-";

  private Nodes() {}

  /**
   * The node of a supply rail. A supply block offers rails by these names; a block takes one by the
   * same name, or by the one that the design maps it to.
   */
  public static String rail(String name) {
    return RAIL_PREFIX + name;
  }

  /** Whether the node is a supply rail. */
  public static boolean isRail(String node) {
    return node.startsWith(RAIL_PREFIX);
  }

  /** Whether the node is shared between blocks rather than local to one. */
  public static boolean isShared(String node) {
    return node.equals(GROUND) || isRail(node);
  }
}
