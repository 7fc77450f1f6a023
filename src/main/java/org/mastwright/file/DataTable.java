package org.mastwright.file;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A table of numbers beside the tower file: columns named in its first line, {@code #} begins a
 * comment. Never read from outside the tower file's own folder.
 */
final class DataTable {
  private static final long MOST_BYTES = 1_000_000;
  private static final int MOST_ROWS = 20_000;

  private DataTable() {}

  /** Rows of the columns wanted, the optional last ones NaN where they are not there. */
  static List<double[]> read(Key at, Optional<Path> folder, List<String> must, List<String> may) {
    Optional<String> text = text(at, folder);
    return text.isEmpty() ? List.of() : rows(at, text.get(), must, may);
  }

  private static Optional<String> text(Key at, Optional<Path> folder) {
    if (folder.isEmpty()) {
      at.error(
          "table",
          "A table beside the tower file cannot be found: the file came from standard input.",
          "Check the file by its name.");
      return Optional.empty();
    }
    try {
      Path home = folder.get().toRealPath();
      Path file = home.resolve(at.text()).normalize();
      if (!file.startsWith(home) || !Files.exists(file)) {
        at.error(
            "table",
            "There is no table " + at.text() + " beside the tower file.",
            "Put the CSV file into the same folder.");
        return Optional.empty();
      }
      if (!file.toRealPath().startsWith(home) || !Files.isRegularFile(file)) {
        at.error(
            "table",
            at.text() + " lies outside the tower file's folder.",
            "Put the CSV file into the same folder.");
        return Optional.empty();
      }
      if (Files.size(file) > MOST_BYTES) {
        at.error("table", at.text() + " is larger than 1 MB.", "");
        return Optional.empty();
      }
      return Optional.of(new String(Files.readAllBytes(file), StandardCharsets.UTF_8));
    } catch (IOException | InvalidPathException unreadable) {
      at.error("table", at.text() + " cannot be read: " + unreadable.getMessage(), "");
      return Optional.empty();
    }
  }

  private static List<double[]> rows(Key at, String text, List<String> must, List<String> may) {
    List<double[]> rows = new ArrayList<>();
    List<String> wanted = new ArrayList<>(must);
    wanted.addAll(may);
    int[] column = null;
    int number = 0;
    for (String line : text.split("\\R")) {
      number++;
      String clean = line.contains("#") ? line.substring(0, line.indexOf('#')) : line;
      if (clean.isBlank()) {
        continue;
      }
      List<String> cells = List.of(clean.split(",", -1)).stream().map(String::trim).toList();
      if (column == null) {
        column = wanted.stream().mapToInt(cells::indexOf).toArray();
        for (int i = 0; i < must.size(); i++) {
          if (column[i] < 0) {
            at.error(
                "table",
                at.text() + ", line " + number + ": no column " + must.get(i) + ".",
                "The first line names the columns: " + String.join(",", must) + ".");
            return List.of();
          }
        }
        continue;
      }
      double[] row = new double[wanted.size()];
      for (int i = 0; i < row.length; i++) {
        row[i] = Double.NaN;
        if (column[i] >= 0) {
          try {
            row[i] = Double.parseDouble(column[i] < cells.size() ? cells.get(column[i]) : "");
          } catch (NumberFormatException wrong) {
            row[i] = Double.NaN;
          }
          if (!Double.isFinite(row[i])) {
            at.error(
                "table",
                at.text() + ", line " + number + ": " + wanted.get(i) + " is no number.",
                "");
            return List.of();
          }
        }
      }
      rows.add(row);
      if (rows.size() > MOST_ROWS) {
        at.error("table", at.text() + " has more than " + MOST_ROWS + " rows.", "");
        return List.of();
      }
    }
    if (rows.size() < 2) {
      at.error("table", at.text() + " has fewer than two rows.", "");
      return List.of();
    }
    for (int i = 1; i < rows.size(); i++) {
      if (!(rows.get(i)[0] > rows.get(i - 1)[0])) {
        at.error(
            "table",
            at.text() + ": " + must.get(0) + " does not rise from row to row.",
            "Sort the rows.");
        return List.of();
      }
    }
    return rows;
  }
}
