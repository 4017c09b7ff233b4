package earward.sheet.content;

import java.util.Objects;

/**
 * Between what a reading of a sound kit lies.
 *
 * @param low lowest
 * @param high highest
 * @param perSupplyVolt by how much both move for each volt of the builder's own supply reading
 *     above the expected one; none where they stay
 */
public record LimitRow(Amount low, Amount high, Amount perSupplyVolt) {
  public LimitRow {
    Objects.requireNonNull(low);
    Objects.requireNonNull(high);
    Objects.requireNonNull(perSupplyVolt);
  }
}
