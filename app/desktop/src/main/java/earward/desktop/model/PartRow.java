package earward.desktop.model;

import earward.block.BlockTexts;
import earward.block.wiring.WiredPart;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.sheet.Sheets;
import java.util.ArrayList;
import java.util.List;

/**
 * One part of the kit, as the table twin of the drawing has it.
 *
 * @param place {@code volume.track}
 * @param reference for instance RV1
 * @param value for instance 22 kΩ
 * @param what it is in its block; may be empty
 * @param block the block's name
 */
public record PartRow(String place, String reference, String value, String what, String block) {
  /** All parts, block by block. */
  public static List<PartRow> of(Assembly assembly) {
    List<PartRow> rows = new ArrayList<>();
    for (PlacedBlock block : assembly.blocks()) {
      BlockTexts texts = Texts.of(block.type());
      for (WiredPart part : block.description().wiring().parts()) {
        String place = block.partName(part);
        rows.add(
            new PartRow(
                place,
                assembly.references().ofPart(place).orElse("–"),
                Sheets.partValue(part.device(), "en"),
                texts.find("part." + part.id()).orElse(""),
                texts.get("name")));
      }
    }
    return rows;
  }
}
