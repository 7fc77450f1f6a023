package org.mastwright.assess;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.units.Unit;
import org.mastwright.working.Check;
import org.mastwright.working.Outcome;

/**
 * Where a factored case has no equilibrium, its forces are those of the last one found, under part
 * of the load: a check that passes with them has shown nothing.
 */
final class Unproved {
  private static final Set<String> FROM_FACTORED_CASES =
      Set.of("tube-strength", "tube-shear", "guy-strength", "guy-hardware", "anchor-capacity");

  private Unproved() {}

  /** The checks, those that pass on such forces marked not assessed. */
  static List<Check> of(List<Check> checks, List<Response> responses) {
    Optional<Response> lost =
        responses.stream()
            .filter(r -> r.mark().limitState() == LimitState.STRENGTH && !r.converged())
            .findFirst();
    if (lost.isEmpty()) {
      return checks;
    }
    String reason =
        "Not shown: "
            + lost.get().mark().id()
            + " has no equilibrium under its factored loads, so the greatest forces are not known;"
            + " those of the last equilibrium ("
            + Unit.ONE.print(lost.get().reachedFactor())
            + " of the variable actions) would pass.";
    return checks.stream().map(c -> unproved(c) ? notShown(c, reason) : c).toList();
  }

  private static boolean unproved(Check c) {
    return FROM_FACTORED_CASES.contains(c.subject().id()) && c.outcome() == Outcome.PASS;
  }

  private static Check notShown(Check c, String reason) {
    return new Check.NotAssessed(c.subject(), c.clause(), reason, c.working(), c.findings());
  }
}
