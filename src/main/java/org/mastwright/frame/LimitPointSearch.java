package org.mastwright.frame;

import java.util.Optional;
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
   * @param whole the balance at factor 1, when the search came so far
   */
  public record Result(
      double factor, OptionalDouble lost, Equilibrium last, Optional<Equilibrium> whole) {}

  /**
   * Goes up in steps from a balance at factor 0, halving the step where the balance is lost.
   *
   * @param start a balance of a chain with the same nodes, to begin near
   * @param capFactor the search ends there
   * @param firstStepFactor to begin with; less than one where the whole load is known to fail
   * @param toleranceFactor the step at which it is given up
   * @throws EquilibriumException when there is no balance under the permanent loads
   */
  public static Result search(
      Chain chain,
      ChainLoad load,
      Equilibrium start,
      double capFactor,
      double firstStepFactor,
      double toleranceFactor) {
    EquilibriumSolver.Options options = new EquilibriumSolver.Options(1e-10, 14, 1, 2);
    Assembler assembler = new Assembler(chain, load);
    EquilibriumSolver.Attempt last =
        EquilibriumSolver.attempt(assembler, start.state().copy(), 0, options);
    if (!last.stands()) {
      last = EquilibriumSolver.attempt(assembler, ChainState.atRest(chain), 0, options);
    }
    if (!last.stands()) {
      throw EquilibriumSolver.failure(assembler, last, 0);
    }
    double reached = 0;
    double step = Math.min(firstStepFactor, capFactor);
    OptionalDouble lost = OptionalDouble.empty();
    Optional<Equilibrium> whole = Optional.empty();
    int iterations = last.iterations;
    while (reached < capFactor && step > toleranceFactor) {
      double next = Math.min(capFactor, reached + step);
      if (reached < 1 && next > 1) {
        next = 1;
      }
      EquilibriumSolver.Attempt trial =
          EquilibriumSolver.attempt(assembler, last.state.copy(), next, options);
      iterations += trial.iterations;
      if (trial.stands()) {
        last = trial;
        reached = next;
        if (reached == 1) {
          whole = Optional.of(at(chain, load, last, 1, iterations));
        }
      } else {
        lost = OptionalDouble.of(next);
        step = Math.min(step, next - reached) / 2;
      }
    }
    return new Result(
        reached,
        reached < capFactor ? lost : OptionalDouble.empty(),
        at(chain, load, last, reached, iterations),
        whole);
  }

  /** A balance with an assembler of its own, which the search does not use further. */
  private static Equilibrium at(
      Chain chain, ChainLoad load, EquilibriumSolver.Attempt found, double factor, int iterations) {
    Assembler own = new Assembler(chain, load);
    ChainState state = found.state.copy();
    own.assemble(state, factor, false);
    return new Equilibrium(own, state, factor, iterations, found.negativePivots);
  }
}
