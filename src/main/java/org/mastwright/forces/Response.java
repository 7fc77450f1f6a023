package org.mastwright.forces;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A solved load case.
 *
 * @param stations from foot to top; at a node both its sides, lower first
 * @param residual greatest unbalanced force over the greatest applied one
 * @param converged false: no equilibrium under the full load; the rest is then the last equilibrium
 *     that was found, at {@code reachedFactor} of the variable actions
 * @param limitFactor on the variable actions at which equilibrium is lost; empty when not searched
 *     for
 */
public record Response(
    CaseMark mark,
    List<SectionForces> stations,
    List<GuyForces> guys,
    BaseReaction base,
    TopMovement top,
    double residual,
    int iterations,
    boolean converged,
    double reachedFactor,
    Optional<LimitPoint> limit) {
  public Response {
    stations = List.copyOf(stations);
    guys = List.copyOf(guys);
  }

  /**
   * The end of the loading path.
   *
   * @param factor greatest factor on the variable actions with an equilibrium
   * @param lost factor at which there was none; empty when the search ended at its cap
   */
  public record LimitPoint(double factor, OptionalDouble lost) {}

  /** The station with the greatest bending moment. */
  public SectionForces greatestMoment() {
    SectionForces worst = stations.get(0);
    for (SectionForces s : stations) {
      if (s.moment_Nm() > worst.moment_Nm()) {
        worst = s;
      }
    }
    return worst;
  }
}
