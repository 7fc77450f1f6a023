package org.mastwright.frame;

import java.util.OptionalDouble;

/** Scales the variable loads until the balance is lost. */
public final class LimitPointSearch {
  private LimitPointSearch() {}

  /**
   * What the search found.
   *
   * @param factor greatest factor with a stable balance
   * @param lost a factor at which there was none, at most the tolerance above; empty when the cap
   *     was reached
   * @param last the balance at {@code factor}
   */
  public record Result(double factor, OptionalDouble lost, Equilibrium last) {}

  /**
   * Goes up in steps from a balance at factor 0, halving the step where the balance is lost.
   *
   * @param capFactor the search ends there
   * @param toleranceFactor the step at which it is given up
   * @throws EquilibriumException when there is no balance under the permanent loads
   */
  public static Result search(
      Chain chain, ChainLoad load, double capFactor, double toleranceFactor) {
    EquilibriumSolver.Options options = new EquilibriumSolver.Options(1e-10, 14, 1);
    Assembler assembler = new Assembler(chain, load);
    EquilibriumSolver.Attempt last =
        EquilibriumSolver.attempt(assembler, ChainState.atRest(chain), 0, options);
    if (!last.found || last.negativePivots > 0) {
      throw EquilibriumSolver.failure(assembler, last, 0);
    }
    double reached = 0;
    double step = Math.min(1, capFactor);
    OptionalDouble lost = OptionalDouble.empty();
    int iterations = last.iterations;
    while (reached < capFactor && step > toleranceFactor) {
      double next = Math.min(capFactor, reached + step);
      EquilibriumSolver.Attempt trial =
          EquilibriumSolver.attempt(assembler, last.state.copy(), next, options);
      iterations += trial.iterations;
      if (trial.found && trial.negativePivots == 0) {
        last = trial;
        reached = next;
      } else {
        lost = OptionalDouble.of(next);
        step = Math.min(step, next - reached) / 2;
      }
    }
    assembler.assemble(last.state, reached, false);
    Equilibrium balance =
        new Equilibrium(assembler, last.state, reached, iterations, last.negativePivots);
    return new Result(reached, reached < capFactor ? lost : OptionalDouble.empty(), balance);
  }
}
