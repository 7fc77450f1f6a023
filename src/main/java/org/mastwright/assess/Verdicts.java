package org.mastwright.assess;

import java.util.List;
import org.mastwright.working.Check;
import org.mastwright.working.Finding;
import org.mastwright.working.Outcome;

/** The one rule that turns checks and open points into the answer. */
final class Verdicts {
  private Verdicts() {}

  /**
   * Fails when a check fails; incomplete when a check was not assessed, an open point stands or
   * nothing was checked at all; passes otherwise.
   */
  static Verdict of(List<Check> checks, List<Finding> findings) {
    if (checks.stream().anyMatch(c -> c.outcome() == Outcome.FAIL)) {
      return Verdict.FAIL;
    }
    boolean open =
        checks.isEmpty()
            || checks.stream().anyMatch(c -> c.outcome() != Outcome.PASS)
            || findings.stream().anyMatch(f -> f.severity() == Finding.Severity.OPEN_POINT);
    return open ? Verdict.INCOMPLETE : Verdict.PASS;
  }
}
