package earward.desktop.view;

import earward.block.Conditions;
import earward.desktop.model.Words;
import earward.kit.design.FrontEndSupply;
import earward.kit.design.KitConditions;
import earward.kit.design.KitDesign;

/** A new kit: no block yet, and conditions until its designer says otherwise. */
public final class NewKit {
  /**
   * The usual IF, tone and depth of receiver measurements, and a kit's room temperature (common
   * practice).
   */
  private static final Conditions USUAL =
      new Conditions(455e3, 400, 4500, 150, 0.3, 0.7, 0.25, 1.5, 4, 25, 40, 0.2);

  private NewKit() {}

  /** The design. */
  public static KitDesign design() {
    return KitDesign.empty(Words.of("untitled"), KitConditions.of(USUAL, FrontEndSupply.BATTERY));
  }
}
