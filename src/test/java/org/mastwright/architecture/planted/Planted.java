package org.mastwright.architecture.planted;

import org.mastwright.working.Outcome;

/** Does what is forbidden, so that the rules are seen to fail. */
final class Planted {
  static int changing;

  private Planted() {}

  static String forbidden() {
    changing++;
    return String.format("%s %d", Outcome.PASS, System.nanoTime());
  }
}
