package earward.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import earward.kit.path.Assembly;
import earward.kit.review.ReviewedKit;
import earward.study.diagnosis.Diagnosis;
import earward.study.diagnosis.Evidence;
import earward.study.diagnosis.RankedGroup;
import earward.study.faults.FaultGuide;

/** A diagnosis, for programs. */
final class DiagnosisJson {
  private DiagnosisJson() {}

  static ObjectNode of(
      ReviewedKit reviewed, Evidence evidence, Diagnosis diagnosis, FaultGuide guide) {
    Assembly assembly = reviewed.solved().assembly();
    ObjectNode root = JsonOut.object().put("schema", "earward-diagnose-1");
    root.set("kit", KitHead.json(reviewed));
    ObjectNode taken = root.putObject("evidence");
    ObjectNode readings = taken.putObject("readings");
    evidence
        .readings()
        .forEach(
            (key, values) -> {
              ArrayNode times = readings.putArray(key);
              values.forEach(times::add);
            });
    ArrayNode tones = taken.putArray("tones");
    evidence.tones().forEach(tone -> tones.add(tone.key()));
    ArrayNode heats = taken.putArray("hotAtRest");
    evidence.heats().forEach(heats::add);
    root.put("healthy", diagnosis.healthy());
    diagnosis.next().ifPresentOrElse(key -> root.put("next", key), () -> root.putNull("next"));
    ArrayNode ranked = root.putArray("ranked");
    for (RankedGroup each : diagnosis.ranked()) {
      ObjectNode node = ranked.addObject();
      each.group()
          .ifPresentOrElse(group -> node.put("group", group.number()), () -> node.putNull("group"));
      JsonOut.put(node, "probability", each.probability());
      node.put("fits", each.fits());
      ArrayNode misfits = node.putArray("misfits");
      each.misfits().forEach(misfits::add);
      ArrayNode faults = node.putArray("faults");
      each.group()
          .ifPresent(
              group -> group.faults().forEach(f -> faults.add(FaultsJson.fault(assembly, f))));
    }
    ArrayNode left = root.putArray("withoutTrace");
    guide.withoutTrace().forEach(each -> left.add(FaultsJson.fault(assembly, each)));
    return root;
  }
}
