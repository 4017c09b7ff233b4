package earward.sheet.internal.section;

import earward.kit.parts.BandColour;
import earward.sheet.content.PartMarking;
import earward.sheet.content.PartMarking.Bands;
import earward.sheet.content.PartMarking.Printed;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Cell;
import earward.sheet.internal.page.Lines;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * The marking of a part: drawn, and in words beside it.
 *
 * @param marking what is seen
 * @param words names the colours
 */
record MarkingCell(PartMarking marking, Words words) implements Cell {
  private static final float PICTURE = 62;
  private static final float BESIDE = 8;

  @Override
  public float height(float width) {
    if (marking instanceof PartMarking.Unmarked) {
      return 0;
    }
    return Math.max(PartPicture.HEIGHT, lines(width).size() * Style.LABEL.leading());
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width, float rowHeight) {
    if (marking instanceof Bands bands) {
      PartPicture.resistor(canvas, x, y, PICTURE, bands.colours());
    } else if (marking instanceof Printed printed) {
      PartPicture.printed(canvas, x, y, PICTURE, printed);
    }
    float baseline = y + Style.LABEL.rise() + (lines(width).size() == 1 ? 2 : 0);
    for (String line : lines(width)) {
      canvas.text(line, x + PICTURE + BESIDE, baseline, Style.LABEL.in(Tone.INK));
      baseline += Style.LABEL.leading();
    }
  }

  private List<String> lines(float width) {
    return Lines.of(inWords(), Style.LABEL, width - PICTURE - BESIDE);
  }

  private String inWords() {
    if (marking instanceof Bands bands) {
      List<String> names = new ArrayList<>();
      for (BandColour colour : bands.colours()) {
        names.add(words.text("colour." + colour.name().toLowerCase(Locale.ROOT)));
      }
      return words.text("marking.bands", "colours", String.join(" ", names), "code", bands.code());
    }
    if (marking instanceof Printed printed) {
      return printed.inWords();
    }
    return "";
  }
}
