package earward.block.testkit;

import earward.block.BlockType;
import earward.block.wiring.Wiring;
import earward.drawing.DrawingRule;
import earward.drawing.LayoutOptions;
import earward.drawing.SheetBlock;
import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;

/**
 * The block's drawing, read back from its geometry, gives the same netlist as its description, and
 * no symbol, wire or text overlaps. What goes wrong here is put right by another placement word or
 * another order of the parts.
 */
public final class PictureRule implements BlockRule {
  private static final String FONT = "/liberation/LiberationSans-Regular.ttf";

  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    LayoutOptions options = LayoutOptions.usual(font());
    Faults faults = new Faults();
    Set<Wiring> seen = new HashSet<>();
    for (Variation variation : variations) {
      variation
          .attempt(type)
          .map(description -> description.wiring())
          .filter(seen::add)
          .ifPresent(wiring -> drawn(wiring, options, variation, faults));
    }
    return faults.all();
  }

  private static void drawn(
      Wiring wiring, LayoutOptions options, Variation variation, Faults faults) {
    try {
      DrawingRule.broken(SheetBlock.plain("block", wiring), options)
          .forEach(sentence -> faults.addIn(variation, "drawn: " + sentence));
    } catch (RuntimeException e) {
      faults.addIn(variation, "it cannot be drawn: " + e);
    }
  }

  /** A font with known metrics, so that a drawing is the same on every machine. */
  private static Font font() {
    try (InputStream in = Objects.requireNonNull(PictureRule.class.getResourceAsStream(FONT))) {
      return Font.createFont(Font.TRUETYPE_FONT, in);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (FontFormatException e) {
      throw new IllegalStateException(FONT + " is no font", e);
    }
  }
}
