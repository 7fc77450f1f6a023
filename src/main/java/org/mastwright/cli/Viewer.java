package org.mastwright.cli;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;

/** Hands a file to whatever this machine shows such files with. */
final class Viewer {
  private Viewer() {}

  /** Shows the file; says so on {@code err} when nothing here can. */
  static void show(Path file, PrintStream err) {
    String system = System.getProperty("os.name", "").toLowerCase(Locale.ROOT);
    List<String> command =
        system.contains("win")
            ? List.of("rundll32", "url.dll,FileProtocolHandler", file.toString())
            : List.of(system.contains("mac") ? "open" : "xdg-open", file.toString());
    try {
      new ProcessBuilder(command)
          .redirectOutput(ProcessBuilder.Redirect.DISCARD)
          .redirectError(ProcessBuilder.Redirect.DISCARD)
          .start();
    } catch (IOException none) {
      err.println("mastwright: nothing here can show " + file + "; open it by hand.");
    }
  }
}
