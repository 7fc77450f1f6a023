package org.mastwright.working;

/** How well a clause or value is known. The report prints it beside the number. */
public enum Status {
  /** The text or a faithful copy was at hand. */
  READ("read"),
  /** From memory; to be compared with the printed document before anyone relies on it. */
  RECALLED("recalled"),
  /** An engineering decision or common practice, no clause. */
  PRACTICE("practice");

  private final String word;

  Status(String word) {
    this.word = word;
  }

  /** The word as printed and as written to results.json. */
  public String word() {
    return word;
  }
}
