package earward.sheet;

import earward.sheet.content.Building;
import earward.sheet.content.ShoppingRow;

/** The shopping list for a spreadsheet: comma-separated, UTF-8, after RFC 4180. */
public final class ShoppingCsv {
  private static final String END = "\r\n";

  private ShoppingCsv() {}

  /** A heading and a line for each kind of part. */
  public static String of(Building building) {
    StringBuilder csv =
        new StringBuilder("part,rating,references,per kit,for " + building.kits() + " kits" + END);
    for (ShoppingRow row : building.shopping()) {
      csv.append(field(row.what()))
          .append(',')
          .append(field(row.rating()))
          .append(',')
          .append(field(String.join(" ", row.references())))
          .append(',')
          .append(row.perKit())
          .append(',')
          .append(row.forKits(building.kits()))
          .append(END);
    }
    return csv.toString();
  }

  /** In quotes where it must be; what a spreadsheet would take for a formula gets a space first. */
  private static String field(String text) {
    String plain = text.replace('\u00a0', ' ').replace('\u202f', ' ');
    String safe = !plain.isEmpty() && "=+-@".indexOf(plain.charAt(0)) >= 0 ? " " + plain : plain;
    boolean quoted = safe.matches("(?s).*[\",\r\n].*");
    return quoted ? '"' + safe.replace("\"", "\"\"") + '"' : safe;
  }
}
