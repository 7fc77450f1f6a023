package org.mastwright.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.LinkedHashMap;
import java.util.Map;

/** Files that appear whole or not at all, in a folder that is ours. */
final class OutputFolder {
  private final Path folder;

  OutputFolder(Path folder) {
    this.folder = folder;
  }

  /** Whether it is new, empty, or was made by this program. */
  boolean isOurs() throws IOException {
    if (!Files.exists(folder)) {
      return true;
    }
    Path results = folder.resolve("results.json");
    if (Files.exists(results)) {
      String head = Files.readString(results);
      return head.substring(0, Math.min(200, head.length())).contains("\"mastwright\"");
    }
    try (var list = Files.list(folder)) {
      return list.findAny().isEmpty();
    }
  }

  /** Writes every file to a temporary name first, then moves them all. */
  void write(Map<String, byte[]> files) throws IOException {
    Files.createDirectories(folder);
    Map<Path, Path> moves = new LinkedHashMap<>();
    try {
      for (Map.Entry<String, byte[]> e : files.entrySet()) {
        Path part = Files.createTempFile(folder, ".part", ".tmp");
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
