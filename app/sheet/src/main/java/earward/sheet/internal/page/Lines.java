package earward.sheet.internal.page;

import java.util.ArrayList;
import java.util.List;

/** Breaks text into lines. */
public final class Lines {
  /** A line is as wide as this more, so that a text fits into its own width. */
  private static final float HAIR = 0.01f;

  private Lines() {}

  /**
   * The lines of a text at a width, broken at spaces; a word that is wider than a line is broken
   * where it must. At least one line.
   *
   * @param width in points
   */
  public static List<String> of(String text, Style style, float width) {
    List<String> lines = new ArrayList<>();
    for (String paragraph : text.split("\n", -1)) {
      breakInto(lines, paragraph, style, width + HAIR);
    }
    return lines;
  }

  private static void breakInto(List<String> lines, String paragraph, Style style, float width) {
    StringBuilder line = new StringBuilder();
    for (String word : paragraph.split(" ", -1)) {
      String rest = word;
      String tried = line.length() == 0 ? rest : line + " " + rest;
      if (Typeface.width(tried, style) <= width) {
        line.setLength(0);
        line.append(tried);
        continue;
      }
      if (line.length() > 0) {
        lines.add(line.toString());
        line.setLength(0);
      }
      while (Typeface.width(rest, style) > width && rest.codePointCount(0, rest.length()) > 1) {
        int cut = fitting(rest, style, width);
        lines.add(rest.substring(0, cut));
        rest = rest.substring(cut);
      }
      line.append(rest);
    }
    lines.add(line.toString());
  }

  /** How much of a word fits, at least one letter. */
  private static int fitting(String word, Style style, float width) {
    int cut = word.offsetByCodePoints(0, 1);
    int next = cut;
    while (next < word.length() && Typeface.width(word.substring(0, next), style) <= width) {
      cut = next;
      next = word.offsetByCodePoints(next, 1);
    }
    return cut;
  }

  /** The text, cut with an ellipsis where it is wider than the width. */
  public static String cut(String text, Style style, float width) {
    if (Typeface.width(text, style) <= width + HAIR) {
      return text;
    }
    int end = text.length();
    while (end > 0 && Typeface.width(text.substring(0, end).strip() + "…", style) > width) {
      end = text.offsetByCodePoints(end, -1);
    }
    return text.substring(0, end).strip() + "…";
  }
}
