package earward.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import earward.kit.path.ProofRow;
import earward.kit.path.WaveformProof;
import earward.kit.review.ReviewedKit;
import java.util.Locale;

/** A proof, for programs. */
final class ProofJson {
  private ProofJson() {}

  static ObjectNode of(ReviewedKit reviewed, WaveformProof proof) {
    ObjectNode root = JsonOut.object().put("schema", "earward-prove-1");
    root.set("kit", KitHead.json(reviewed));
    root.put("case", proof.caseName().text());
    JsonOut.put(root, "wantedToneHertz", proof.wantedToneHertz());
    JsonOut.put(root, "toneHertz", proof.result().toneHertz());
    root.put("carrierCyclesPerTone", proof.result().cyclesPerTone());
    root.put("stepsPerCarrierCycle", proof.result().stepsPerCycle());
    root.put("steps", proof.result().steps());
    JsonOut.put(root, "feedWatts", proof.result().feedWatts());
    root.put("agrees", proof.agrees());
    ArrayNode figures = root.putArray("figures");
    proof.rows().forEach(row -> figures.add(row(row)));
    return root;
  }

  private static ObjectNode row(ProofRow row) {
    ObjectNode node =
        JsonOut.object()
            .put("place", row.place())
            .put("quantity", row.quantity().key())
            .put("unit", row.unit().name().toLowerCase(Locale.ROOT).replace('_', '-'));
    JsonOut.put(node, "averaged", row.averaged());
    JsonOut.put(node, "full", row.full());
    JsonOut.put(node, "limit", row.limit());
    return node.put("agrees", row.agrees());
  }
}
