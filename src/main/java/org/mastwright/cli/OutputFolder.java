package org.mastwright.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.LinkedHashMap;
import java.util.Map;
import org.mastwright.assess.Assessment;
import org.mastwright.file.ResultsJson;

/** Files that appear whole or not at all, in a folder that is ours. */
final class OutputFolder {
  private final Path folder;
  private final Map<String, byte[]> files = new LinkedHashMap<>();

  OutputFolder(Path folder) {
    this.folder = folder;
  }

  void add(String name, byte[] content) {
    files.put(name, content);
  }

  /** The results and the tower file as it was read. */
  void addResults(Assessment a, byte[] towerFile) {
    add("results.json", ResultsJson.bytes(a));
    add("tower-file.yaml", towerFile);
  }

  Path path(String name) {
    return folder.resolve(name);
  }

  /** {@code orchard-check/ report.pdf results.json}. */
  String words() {
    return folder + "/  " + String.join("  ", files.keySet());
  }

  String refusal() {
    return "mastwright: "
        + folder
        + " holds files that this program did not make; nothing was written. Take another folder"
        + " with --into.";
  }

  /** Whether it is new, empty, or was made by this program. */
  boolean isOurs() throws IOException {
    if (!Files.exists(folder)) {
      return true;
    }
    if (!Files.isDirectory(folder)) {
      return false;
    }
    Path results = folder.resolve("results.json");
    if (Files.exists(results)) {
      String head = new String(Files.readAllBytes(results), 0, headLength(results));
      return head.contains("\"mastwright\"");
    }
    try (var list = Files.list(folder)) {
      return list.findAny().isEmpty();
    }
  }

  private static int headLength(Path results) throws IOException {
    return (int) Math.min(200, Files.size(results));
  }

  /**
   * Writes every file to a temporary name first, then moves them all; what a stopped run leaves
   * behind is taken away as the program ends.
   */
  void write() throws IOException {
    Files.createDirectories(folder);
    Map<Path, Path> moves = new LinkedHashMap<>();
    try {
      for (Map.Entry<String, byte[]> e : files.entrySet()) {
        Path part = Files.createTempFile(folder, ".part", ".tmp");
        part.toFile().deleteOnExit();
        moves.put(part, folder.resolve(e.getKey()));
        Files.write(part, e.getValue());
      }
      for (Map.Entry<Path, Path> m : moves.entrySet()) {
        Files.move(m.getKey(), m.getValue(), StandardCopyOption.REPLACE_EXISTING);
      }
    } finally {
      for (Path part : moves.keySet()) {
        Files.deleteIfExists(part);
      }
    }
  }
}
