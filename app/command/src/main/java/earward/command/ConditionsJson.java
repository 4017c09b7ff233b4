package earward.command;

import com.fasterxml.jackson.databind.node.ObjectNode;
import earward.block.Conditions;
import earward.block.law.ToneCurve;
import earward.kit.design.KitConditions;

/** The conditions of a kit, for programs. */
final class ConditionsJson {
  private ConditionsJson() {}

  static ObjectNode of(KitConditions conditions) {
    Conditions core = conditions.core();
    ToneCurve curve =
        conditions.wanted().curve().orElseGet(() -> ToneCurve.lowPass(core.highestToneHertz()));
    ObjectNode node = JsonOut.object();
    node.put("carrierHertz", core.carrierHertz())
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
        .put("frontEndSupply", conditions.frontEndSupply().key())
        .put("frontEnd", frontEnd(conditions))
        .put("curve", curve.kind().key());
    boolean corner = curve.kind() == ToneCurve.Kind.LOW_PASS;
    JsonOut.put(node, "curveCornerHertz", corner ? curve.cornerHertz() : Double.NaN);
    return node.put("listeningMetres", conditions.wanted().listeningMetres());
  }

  private static String frontEnd(KitConditions conditions) {
    if (conditions.circuits().isPresent()) {
      return "tuned-circuits";
    }
    return conditions.sidebands().isEmpty() ? "flat" : "points";
  }
}
