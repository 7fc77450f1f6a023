package org.mastwright.assess;

/** The answer word. */
public enum Verdict {
  PASS("pass", "MEETS THE CHECKS LISTED"),
  FAIL("fail", "DOES NOT PASS"),
  INCOMPLETE("incomplete", "INCOMPLETE"),
  VERIFICATION("verification", "VERIFICATION");

  private final String word;
  private final String answer;

  Verdict(String word, String answer) {
    this.word = word;
    this.answer = answer;
  }

  /** The word of results.json. */
  public String word() {
    return word;
  }

  /** The words on paper and screen. */
  public String answer() {
    return answer;
  }
}
