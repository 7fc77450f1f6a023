package org.mastwright.report;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * A table as it is printed.
 *
 * @param caption above it
 * @param heads one per column
 * @param rows cells in the order of the heads
 */
public record Table(String caption, List<Head> heads, List<Row> rows) {
  private static final int MANY_ROWS = 12;

  public Table {
    heads = List.copyOf(heads);
    rows = List.copyOf(rows);
    for (Row row : rows) {
      if (row.cells().size() != heads.size()) {
        throw new IllegalArgumentException(caption + ": " + row.cells() + " against " + heads);
      }
    }
  }

  /** A column head with the style of its column. */
  public record Head(String text, String style) {}

  /** A row; {@code style} is blank or names a class such as {@code marked}. */
  public record Row(List<Cell> cells, String style) {
    public Row {
      cells = List.copyOf(cells);
    }
  }

  /** A cell with the style of its column. */
  public record Cell(String text, String style) {}

  /** Whether there is anything to print. */
  public boolean filled() {
    return !rows.isEmpty();
  }

  /** Long tables are set closer. */
  public String style() {
    return rows.size() > MANY_ROWS ? "close" : "open";
  }

  static Builder of(String caption) {
    return new Builder(caption);
  }

  /** Collects columns, all of the same length. */
  static final class Builder {
    private final String caption;
    private final List<Head> heads = new ArrayList<>();
    private final List<List<String>> columns = new ArrayList<>();
    private List<Boolean> marked = List.of();

    private Builder(String caption) {
      this.caption = caption;
    }

    /** A column of words. */
    Builder words(String head, List<String> cells) {
      return column(head, "words", cells);
    }

    /** A narrow column of words. */
    Builder brief(String head, List<String> cells) {
      return column(head, "brief", cells);
    }

    /** A column of numbers. */
    Builder numbers(String head, List<String> cells) {
      return column(head, "number", cells);
    }

    /** Rows to be printed bold. */
    Builder marked(List<Boolean> rows) {
      marked = rows;
      return this;
    }

    private Builder column(String head, String style, List<String> cells) {
      heads.add(new Head(head, style));
      columns.add(cells);
      return this;
    }

    Table build() {
      int count = columns.isEmpty() ? 0 : columns.get(0).size();
      List<Boolean> bold = marked.isEmpty() ? Collections.nCopies(count, false) : marked;
      List<Row> rows = new ArrayList<>();
      for (int i = 0; i < count; i++) {
        List<Cell> cells = new ArrayList<>();
        for (int j = 0; j < heads.size(); j++) {
          cells.add(new Cell(columns.get(j).get(i), heads.get(j).style()));
        }
        rows.add(new Row(cells, bold.get(i) ? "marked" : ""));
      }
      return new Table(caption, heads, rows);
    }
  }
}
