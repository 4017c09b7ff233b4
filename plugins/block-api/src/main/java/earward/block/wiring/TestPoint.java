package earward.block.wiring;

/**
 * A node where the builder is to measure.
 *
 * @param id local to the block; its text is {@code test-point.ID}
 * @param node local or shared
 */
public record TestPoint(String id, String node) {
  public TestPoint {
    Names.require(id, "test point");
    Names.require(node, "node of test point '" + id + "'");
  }
}
