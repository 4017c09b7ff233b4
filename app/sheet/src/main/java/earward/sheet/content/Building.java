package earward.sheet.content;

import java.util.List;

/**
 * How the kit is bought and built.
 *
 * @param stages in the order of building; empty where the kit could not be solved
 * @param wires off the board
 * @param shopping what is bought
 * @param kits for how many kits it is bought
 */
public record Building(
    List<StageRow> stages, List<WireRow> wires, List<ShoppingRow> shopping, int kits) {
  /** Nothing of it. */
  public static final Building NONE = new Building(List.of(), List.of(), List.of(), 1);

  public Building {
    stages = List.copyOf(stages);
    wires = List.copyOf(wires);
    shopping = List.copyOf(shopping);
    if (kits < 1) {
      throw new IllegalArgumentException(
          "parts are bought for " + kits + " kits; wanted 1 or more");
    }
  }

  /** The same for so many kits. */
  public Building forKits(int changed) {
    return new Building(stages, wires, shopping, changed);
  }
}
