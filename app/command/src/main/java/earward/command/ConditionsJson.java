package earward.command;

import com.fasterxml.jackson.databind.node.ObjectNode;
import earward.block.Conditions;
import earward.kit.design.KitConditions;

/** The conditions of a kit, for programs. */
final class ConditionsJson {
  private ConditionsJson() {}

  static ObjectNode of(KitConditions conditions) {
    Conditions core = conditions.core();
    return JsonOut.object()
        .put("carrierHertz", core.carrierHertz())
        .put("testToneHertz", core.toneHertz())
        .put("lowestToneHertz", core.lowestToneHertz())
        .put("highestToneHertz", core.highestToneHertz())
        .put("testDepthFraction", core.testDepth())
        .put("deepestDepthFraction", core.deepestDepth())
        .put("weakCarrierPeakVolts", core.weakPeakVolts())
        .put("testCarrierPeakVolts", core.testPeakVolts())
        .put("strongCarrierPeakVolts", core.strongPeakVolts())
        .put("ambientCelsius", core.ambientCelsius())
        .put("highestAmbientCelsius", core.highestAmbientCelsius())
        .put("wantedWatts", core.wantedWatts())
        .put("frontEndSupply", conditions.frontEndSupply().key());
  }
}
