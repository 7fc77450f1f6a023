package org.mastwright.working;

/** The one place where a utilisation becomes an outcome. */
final class Outcomes {
  private Outcomes() {}

  /** Pass only for a number that is at most 1: a value that is not a number fails. */
  static Outcome ofUtilisation(double utilisationRatio) {
    return utilisationRatio <= 1.0 ? Outcome.PASS : Outcome.FAIL;
  }
}
