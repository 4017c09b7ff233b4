package earward.drawing;

import java.util.List;

/** Lays circuit drawings out from block descriptions. */
public final class Schematics {
  private Schematics() {}

  /**
   * The drawing of a signal path and what stands beside it.
   *
   * @param path blocks in the order of the signal
   * @param beside supplies and take-offs
   */
  public static Schematic lay(
      List<SheetBlock> path, List<SheetBlock> beside, LayoutOptions options) {
    return new Schematic(options.widthPoints(), 0, options.font(), List.of(), List.of());
  }

  /** The drawing of one block alone. */
  public static Schematic single(SheetBlock block, LayoutOptions options) {
    return lay(List.of(block), List.of(), options);
  }
}
