package org.mastwright.cli;

import java.io.PrintStream;
import org.mastwright.assess.Progress;

/**
 * How far the work has come, on standard error: one line replaced in place on a terminal once a
 * second has passed; a line per stage elsewhere; nothing when quiet.
 */
final class ProgressLine implements Progress {
  private static final long PATIENCE_NS = 1_000_000_000L;

  private final PrintStream err;
  private final boolean quiet;
  private final boolean inPlace;
  private final long began = System.nanoTime();
  private String stage = "";
  private boolean shown;

  ProgressLine(PrintStream err, TowerOptions options) {
    this.err = err;
    this.quiet = options.quiet;
    this.inPlace =
        !options.plain && System.console() != null && !"dumb".equals(System.getenv("TERM"));
  }

  @Override
  public synchronized void stage(String words, int done, int of) {
    if (quiet || System.nanoTime() - began < PATIENCE_NS) {
      return;
    }
    if (inPlace) {
      err.print("\r" + words + (of > 1 ? "  " + done + " of " + of : "") + "\033[K");
      err.flush();
      shown = true;
    } else if (!words.equals(stage)) {
      err.println(words);
    }
    stage = words;
  }

  /** Takes the line away. */
  synchronized void clear() {
    if (shown) {
      err.print("\r\033[K");
      err.flush();
      shown = false;
    }
  }
}
