package org.mastwright.assess;

import java.util.List;
import org.mastwright.forces.LimitState;
import org.mastwright.working.Clause;

/**
 * A combination as the report lists it.
 *
 * @param casesRun how many directions and variants were solved
 */
public record CombinationSummary(
    String code,
    String title,
    String composition,
    String purpose,
    LimitState limitState,
    Clause clause,
    List<FactorUsed> factors,
    int casesRun) {
  public CombinationSummary {
    factors = List.copyOf(factors);
  }

  /** A partial factor with its source. */
  public record FactorUsed(String name, double valueFactor, Clause clause) {}
}
