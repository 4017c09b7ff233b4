package earward.sheet.internal.gather;

import earward.block.device.Terminal;
import earward.block.wiring.WiredPart;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.sheet.content.WireRow;
import earward.sheet.internal.section.Words;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** The wires that leave the board, end by end. */
final class WireRows {
  private final Assembly assembly;
  private final Words words;
  private final Joints joints;

  WireRows(Assembly assembly, Words words) {
    this.assembly = assembly;
    this.words = words;
    this.joints = new Joints(assembly, words);
  }

  List<WireRow> rows() {
    List<WireRow> rows = new ArrayList<>();
    for (PlacedBlock block : assembly.blocks()) {
      for (WiredPart part : block.description().wiring().parts()) {
        if (Heights.offBoard(part.device())
            && assembly.references().ofPart(block.partName(part)).isPresent()) {
          part.nodes().forEach((terminal, node) -> rows.add(row(block, part, terminal, node)));
        }
      }
    }
    return rows;
  }

  private WireRow row(PlacedBlock block, WiredPart part, Terminal terminal, String node) {
    String key = terminal.name().toLowerCase(Locale.ROOT).replace('_', '-');
    String leads = joints.from(block.partName(part), block.globalNode(node));
    return new WireRow(
        PartRows.reference(assembly, block, part.id()) + ", " + words.text("terminal." + key),
        leads.isEmpty() ? words.text("joint.nothing") : leads);
  }
}
