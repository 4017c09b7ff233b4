package earward.sheet.content;

import java.util.List;
import java.util.Objects;

/**
 * One kind of part to buy.
 *
 * @param what for instance Resistor 4.7 kΩ
 * @param rating what else must be ordered; may be empty
 * @param references of the parts in one kit
 * @param spareShare more of it that is bought against breaking and losing
 */
public record ShoppingRow(String what, String rating, List<String> references, double spareShare) {
  public ShoppingRow {
    Objects.requireNonNull(what);
    Objects.requireNonNull(rating);
    references = List.copyOf(references);
    if (references.isEmpty() || !(spareShare >= 0 && spareShare < 1)) {
      throw new IllegalArgumentException("'" + what + "' is bought for no part, or with no spares");
    }
  }

  /** How many are in one kit. */
  public int perKit() {
    return references.size();
  }

  /** How many are bought for so many kits, spares included; for a single one there are none. */
  public int forKits(int kits) {
    int needed = Math.multiplyExact(perKit(), kits);
    return kits == 1 ? needed : needed + (int) Math.ceil(needed * spareShare);
  }
}
