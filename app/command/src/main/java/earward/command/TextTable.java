package earward.command;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.List;

/** Rows of text in columns as wide as their widest entry; used once, by one thread. */
final class TextTable {
  private static final String GAP = "  ";

  private final List<List<String>> rows = new ArrayList<>();

  TextTable row(String... cells) {
    rows.add(List.of(cells));
    return this;
  }

  boolean isEmpty() {
    return rows.size() <= 1;
  }

  void print(PrintWriter to) {
    int columns = rows.stream().mapToInt(List::size).max().orElse(0);
    int[] widths = new int[columns];
    for (List<String> row : rows) {
      for (int i = 0; i < row.size(); i++) {
        widths[i] = Math.max(widths[i], length(row.get(i)));
      }
    }
    for (List<String> row : rows) {
      StringBuilder line = new StringBuilder();
      for (int i = 0; i < row.size(); i++) {
        line.append(row.get(i)).append(" ".repeat(widths[i] - length(row.get(i)))).append(GAP);
      }
      to.println(line.toString().stripTrailing());
    }
  }

  private static int length(String cell) {
    return cell.codePointCount(0, cell.length());
  }
}
