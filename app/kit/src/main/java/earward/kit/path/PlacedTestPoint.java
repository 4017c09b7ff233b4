package earward.kit.path;

/**
 * A place where the builder measures.
 *
 * @param place its name in figures and references: {@code volume.wiper}, or {@code added.ID} for
 *     one of the designer's own
 * @param node of the whole circuit
 * @param reference for instance TP3
 * @param words the designer's own words for it; empty for a block's own test point, whose words are
 *     the block's text {@code test-point.ID}
 */
public record PlacedTestPoint(String place, String node, String reference, String words) {}
