package earward.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import earward.kit.path.Assembly;
import earward.kit.review.ReviewedKit;
import earward.study.faults.FaultGroup;
import earward.study.faults.FaultGuide;
import earward.study.faults.FaultReading;
import earward.study.faults.FaultSigns;
import earward.study.faults.Signs;
import java.util.Locale;

/** A fault guide, for programs. */
final class FaultsJson {
  private FaultsJson() {}

  static ObjectNode of(ReviewedKit reviewed, FaultGuide guide) {
    Assembly assembly = reviewed.solved().assembly();
    ObjectNode root = JsonOut.object().put("schema", "earward-faults-1");
    root.set("kit", KitHead.json(reviewed));
    root.put("faults", guide.faults());
    ArrayNode readings = root.putArray("readings");
    for (int i = 0; i < guide.readings().size(); i++) {
      FaultReading reading = guide.readings().get(i);
      ObjectNode node =
          readings
              .addObject()
              .put("key", reading.key())
              .put("place", reading.place())
              .put("unit", reading.unit().name().toLowerCase(Locale.ROOT).replace('_', '-'))
              .put("needsSignal", reading.needsSignal());
      JsonOut.put(node, "deviationShare", guide.deviations().get(i));
    }
    root.set("healthy", signs(guide, guide.healthy()));
    ArrayNode groups = root.putArray("groups");
    guide.groups().forEach(group -> groups.add(group(assembly, guide, group)));
    ArrayNode left = root.putArray("withoutTrace");
    guide.withoutTrace().forEach(each -> left.add(fault(assembly, each)));
    return root;
  }

  private static ObjectNode group(Assembly assembly, FaultGuide guide, FaultGroup group) {
    ObjectNode node = JsonOut.object().put("number", group.number());
    JsonOut.put(node, "probability", group.prior());
    ArrayNode tells = node.putArray("tells");
    group.tells().forEach(tells::add);
    node.set("signs", signs(guide, group.signs()));
    ArrayNode faults = node.putArray("faults");
    group.faults().forEach(each -> faults.add(fault(assembly, each)));
    return node;
  }

  static ObjectNode signs(FaultGuide guide, Signs signs) {
    ObjectNode node =
        JsonOut.object().put("tone", signs.tone().key()).put("hotAtRest", signs.hot());
    ObjectNode readings = node.putObject("readings");
    for (int i = 0; i < guide.readings().size(); i++) {
      JsonOut.put(readings, guide.readings().get(i).key(), signs.readings().get(i));
    }
    return node;
  }

  static ObjectNode fault(Assembly assembly, FaultSigns each) {
    ObjectNode node = JsonOut.object().put("id", each.fault().id());
    ArrayNode parts = node.putArray("parts");
    each.fault().parts().forEach(parts::add);
    node.put("kind", each.fault().kind().key())
        .put("sentence", FaultWords.sentence(assembly, each.fault()));
    JsonOut.put(node, "probability", each.fault().prior());
    return node;
  }
}
