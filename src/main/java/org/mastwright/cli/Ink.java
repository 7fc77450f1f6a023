package org.mastwright.cli;

/**
 * Three colours for the answer words, on a terminal that wants them: red fails, yellow not assessed
 * or close, none for what passes. The word is always there.
 */
final class Ink {
  private static final String RED = "\033[31m";
  private static final String YELLOW = "\033[33m";
  private static final String NONE = "\033[0m";

  private final boolean coloured;

  Ink(boolean plain) {
    this.coloured =
        !plain
            && System.console() != null
            && System.getenv("NO_COLOR") == null
            && !"dumb".equals(System.getenv("TERM"));
  }

  /** A line with its answer word coloured. */
  String verdict(String line) {
    if (!coloured) {
      return line;
    }
    return line.replaceFirst("(DOES NOT PASS|FAILS)", RED + "$1" + NONE)
        .replaceFirst("(INCOMPLETE|NOT CHECKED|passes, close)", YELLOW + "$1" + NONE);
  }
}
