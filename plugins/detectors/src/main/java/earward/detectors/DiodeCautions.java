package earward.detectors;

import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.wiring.Caution;
import earward.block.wiring.WiringPlan;

/** The hazards of a detector diode: glass, and where it is germanium the iron's heat. */
final class DiodeCautions {
  private DiodeCautions() {}

  static WiringPlan of(WiringPlan plan, String partId, DiodeModel model) {
    plan.caution(partId, Caution.GLASS_DIODE);
    return model.material() == DiodeMaterial.GERMANIUM
        ? plan.caution(partId, Caution.GERMANIUM_HEAT)
        : plan;
  }
}
