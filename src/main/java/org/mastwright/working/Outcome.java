package org.mastwright.working;

/** What a check found. */
public enum Outcome {
  PASS("pass"),
  FAIL("fail"),
  NOT_ASSESSED("not-assessed");

  private final String word;

  Outcome(String word) {
    this.word = word;
  }

  /** The word of results.json. */
  public String word() {
    return word;
  }
}
