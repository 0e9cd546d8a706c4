package sliprung.record;

import java.util.ArrayList;
import java.util.List;

/** Tables of plain cells. */
final class Cells {
  private final Html page;

  Cells(Html page) {
    this.page = page;
  }

  /** Opens a table with a caption and its heads; a head that begins with {@code #} is numeric. */
  Cells open(String caption, List<String> heads, String... attributes) {
    page.open("div", "class", "wide").open("table", attributes).markup("\n");
    page.element("caption", caption);
    page.open("thead").open("tr");
    for (String head : heads) {
      if (head.startsWith("#")) {
        page.element("th", head.substring(1), "scope", "col", "class", "number");
      } else {
        page.element("th", head, "scope", "col");
      }
    }
    page.end().end();
    page.open("tbody").markup("\n");
    numeric = heads.stream().map(h -> h.startsWith("#")).toList();
    return this;
  }

  /** A whole table of many short rows, as many of them abreast as the page takes. */
  static void abreast(
      Html page, String caption, List<String> heads, List<List<String>> rows, String style) {
    int columns = Math.min(page.figures().rowsAbreast(), Math.max(1, rows.size()));
    List<String> allHeads = new ArrayList<>();
    for (int c = 0; c < columns; c++) {
      allHeads.addAll(heads);
    }
    Cells cells =
        new Cells(page).open(caption, allHeads, "class", columns > 1 ? style + " abreast" : style);
    int deep = (rows.size() + columns - 1) / columns;
    for (int i = 0; i < deep; i++) {
      List<String> row = new ArrayList<>();
      for (int k = i; k < columns * deep; k += deep) {
        row.addAll(k < rows.size() ? rows.get(k) : heads.stream().map(h -> "").toList());
      }
      cells.row(row.toArray(String[]::new));
    }
    cells.close();
  }

  private List<Boolean> numeric = List.of();

  /** A row; its first cell heads it. */
  Cells row(String... cells) {
    page.open("tr");
    for (int i = 0; i < cells.length; i++) {
      if (i == 0) {
        page.element("th", cells[i], "scope", "row");
      } else if (numeric.get(i)) {
        page.element("td", cells[i], "class", "number");
      } else {
        page.element("td", cells[i]);
      }
    }
    page.end();
    return this;
  }

  /** A row of plain cells but for the first, each of a class of its own. */
  Cells row(List<String> texts, List<String> classes) {
    page.open("tr");
    for (int i = 0; i < texts.size(); i++) {
      if (i == 0) {
        page.element("th", texts.get(i), "scope", "row");
      } else {
        page.element("td", texts.get(i), "class", classes.get(i));
      }
    }
    page.end();
    return this;
  }

  /** Closes the table. */
  void close() {
    page.end().end().end();
  }
}
