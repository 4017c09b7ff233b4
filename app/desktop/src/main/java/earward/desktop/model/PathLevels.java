package earward.desktop.model;

import earward.block.BlockTexts;
import earward.block.Role;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.kit.design.QuantityText;
import earward.kit.path.Figures;
import earward.kit.path.PlacedBlock;
import earward.kit.review.ReviewedKit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Reads the level diagram off a reviewed kit; nothing is worked out that was not solved. */
public final class PathLevels {
  private static final CaseName SHOWN = CaseName.TEST;

  private PathLevels() {}

  /** The cards of the path in its order. */
  public static List<LevelCard> of(ReviewedKit kit) {
    List<LevelCard> cards = new ArrayList<>();
    boolean detected = false;
    for (PlacedBlock block : kit.solved().assembly().path()) {
      detected |= block.type().role() == Role.DETECTOR;
      cards.add(card(kit.figures(), block, !detected));
    }
    return cards;
  }

  private static LevelCard card(Figures figures, PlacedBlock block, boolean carrier) {
    Quantity quantity = carrier ? Quantity.CARRIER_RMS_VOLTS : Quantity.AUDIO_RMS_VOLTS;
    boolean end = block.description().wiring().exit().isEmpty();
    double volts = figures.find(end ? "path" : block.id(), quantity, SHOWN).orElse(Double.NaN);
    double headroom =
        figures.find("seam." + block.id(), Quantity.HEADROOM_DECIBELS, SHOWN).orElse(Double.NaN);
    return new LevelCard(
        block.id(),
        title(block),
        carrier,
        volts > 0 ? 20 * Math.log10(volts) : Double.NaN,
        volts > 0 ? QuantityText.format(volts, Unit.VOLT, Locale.ENGLISH) : "–",
        headroom);
  }

  /** Supplies and take-offs. */
  public static List<SideCard> beside(ReviewedKit kit) {
    List<SideCard> cards = new ArrayList<>();
    for (PlacedBlock block : kit.solved().assembly().beside()) {
      double amperes =
          kit.figures().find(block.id(), Quantity.SUPPLY_AMPERES, SHOWN).orElse(Double.NaN);
      String says =
          Double.isNaN(amperes) ? "" : QuantityText.format(amperes, Unit.AMPERE, Locale.ENGLISH);
      cards.add(new SideCard(block.id(), title(block), says));
    }
    return cards;
  }

  /** What a block is called. */
  static String title(PlacedBlock block) {
    return BlockTexts.of(block.type(), Locale.ENGLISH).get("name");
  }
}
