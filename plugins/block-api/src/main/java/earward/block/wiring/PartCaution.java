package earward.block.wiring;

import java.util.Objects;

/**
 * A hazard that belongs to a part.
 *
 * @param partId local to the block
 * @param caution the hazard
 */
public record PartCaution(String partId, Caution caution) {
  public PartCaution {
    Names.require(partId, "part");
    Objects.requireNonNull(caution);
  }
}
