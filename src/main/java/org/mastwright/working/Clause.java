package org.mastwright.working;

/**
 * Where a formula or value comes from.
 *
 * @param document standard, handbook or report, such as {@code EN 1993-1-1}
 * @param edition year, or {@code -} where it has none
 * @param number clause, equation, table or page
 * @param status whether it was read or recalled, or is practice
 */
public record Clause(String document, String edition, String number, Status status) {
  public Clause {
    if (document.isBlank() || edition.isBlank() || number.isBlank() || status == null) {
      throw new IllegalArgumentException("a clause names its document, edition, number, status");
    }
  }

  /** {@code EN 1993-1-1:2005, 6.2.4(2)}. */
  public String cite() {
    String name = edition.equals("-") ? document : document + ":" + edition;
    return name + ", " + number;
  }

  /** {@link #cite()} and the status word: {@code EN 1993-1-1:2005, 6.2.4(2) [recalled]}. */
  public String citeWithStatus() {
    return cite() + " [" + status.word() + "]";
  }
}
