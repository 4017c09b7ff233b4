package earward.desktop.model;

import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * What can be selected in a design, as text: a block's id; {@code >ID} for the seam by which a
 * block of the path is entered; one of the kit's own forms.
 */
public final class Selection {
  /** The conditions: the first card. */
  public static final String CONDITIONS = "#conditions";

  /** Tolerances of the parts. */
  public static final String TOLERANCES = "#tolerances";

  /** The builder's instruments. */
  public static final String BENCH = "#bench";

  /** How the sheet is to look. */
  public static final String SHEET = "#sheet";

  private static final List<String> OWN = List.of(CONDITIONS, TOLERANCES, BENCH, SHEET);

  private Selection() {}

  /** The seam by which a block is entered. */
  public static String seam(String blockId) {
    return ">" + blockId;
  }

  /** The block whose seam is selected; empty where no seam is. */
  public static Optional<String> seamOf(String selected) {
    return selected.startsWith(">") ? Optional.of(selected.substring(1)) : Optional.empty();
  }

  /** Whether it is one of the kit's own forms. */
  public static boolean own(String selected) {
    return OWN.contains(selected);
  }

  /** Whether a design has it. */
  public static boolean exists(KitDesign design, String selected) {
    return own(selected) || design.block(seamOf(selected).orElse(selected)).isPresent();
  }

  /** All that a walk along the path comes by: conditions, blocks with their seams, beside. */
  public static List<String> walk(KitDesign design) {
    List<String> stops = new ArrayList<>();
    stops.add(CONDITIONS);
    List<BlockEntry> path = design.path();
    for (int i = 0; i < path.size(); i++) {
      if (i > 0) {
        stops.add(seam(path.get(i).id()));
      }
      stops.add(path.get(i).id());
    }
    design.supplies().forEach(block -> stops.add(block.id()));
    design.takeOffs().forEach(block -> stops.add(block.id()));
    return stops;
  }
}
