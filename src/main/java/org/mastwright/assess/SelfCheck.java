package org.mastwright.assess;

import java.util.List;

/**
 * The proof that the calculation balances.
 *
 * @param equilibriumRatio greatest unbalanced global force or moment over the greatest applied, of
 *     all cases
 * @param residualRatio greatest Newton residual of all cases
 * @param modeCount whether the count of negative pivots proves that no mode was missed
 * @param secondMethodRatio greatest relative difference of the second methods
 * @param rows each comparison with its two numbers
 */
public record SelfCheck(
    double equilibriumRatio,
    double residualRatio,
    boolean modeCount,
    double secondMethodRatio,
    List<Row> rows) {
  public SelfCheck {
    rows = List.copyOf(rows);
  }

  /** One comparison: what, by which two routes, in which unit symbol, how far apart. */
  public record Row(
      String what, String first, double firstSi, String second, double secondSi, String unit) {}
}
