package org.mastwright.frame;

import java.util.Optional;

/**
 * Finds the balance of a chain by Newton's method with a line search, the variable loads in as many
 * steps as it takes.
 */
public final class EquilibriumSolver {
  /** Largest spin of a node in one iteration. */
  private static final double MOST_SPIN_RAD = 0.5;

  private static final int MOST_HALVINGS = 4;

  private EquilibriumSolver() {}

  /**
   * How far and how long to iterate.
   *
   * @param toleranceRatio unbalanced force over the greatest force
   * @param mostIterations of one load step
   * @param leastStepFraction of the variable loads before it is given up
   * @param patienceIterations after so many, a tangent that is not positive ends the attempt: a
   *     smaller step is cheaper than a search beyond the limit point
   */
  public record Options(
      double toleranceRatio, int mostIterations, double leastStepFraction, int patienceIterations) {
    /** 1e-10, 40 iterations, a sixty-fourth of the load. */
    public static final Options USUAL = new Options(1e-10, 40, 1.0 / 64, 40);
  }

  /** The balance under all loads, from rest. */
  public static Equilibrium solve(Chain chain, ChainLoad load) {
    return solve(chain, load, 1, Optional.empty(), Options.USUAL);
  }

  /**
   * The balance under the permanent loads and {@code factor} times the variable ones.
   *
   * @param start a balance of a chain with the same nodes to start from
   * @throws EquilibriumException with cause, node and iterations
   */
  public static Equilibrium solve(
      Chain chain, ChainLoad load, double factor, Optional<Equilibrium> start, Options options) {
    Assembler assembler = new Assembler(chain, load);
    ChainState state = start.map(s -> s.state().copy()).orElseGet(() -> ChainState.atRest(chain));
    if (start.isPresent()) {
      Attempt direct = attempt(assembler, state, factor, options);
      if (direct.stands()) {
        return direct.result(assembler, factor);
      }
      state = ChainState.atRest(chain);
    }
    Attempt still = attempt(assembler, state, 0, options);
    if (!still.stands()) {
      throw failure(assembler, still, 0);
    }
    return climb(assembler, still, 0, factor, options);
  }

  /** One go at all loads from a balance near by; empty when it does not settle. */
  public static Optional<Equilibrium> near(
      Chain chain, ChainLoad load, Equilibrium start, Options options) {
    Assembler assembler = new Assembler(chain, load);
    Attempt direct = attempt(assembler, start.state().copy(), 1, options);
    return direct.stands() ? Optional.of(direct.result(assembler, 1)) : Optional.empty();
  }

  /** From a balance at one factor to another, in steps. */
  static Equilibrium climb(
      Assembler assembler, Attempt from, double fromFactor, double toFactor, Options options) {
    Attempt last = from;
    double reached = fromFactor;
    double step = toFactor - fromFactor;
    double least = Math.abs(step) * options.leastStepFraction();
    int iterations = from.iterations;
    while (reached < toFactor) {
      double next = Math.min(toFactor, reached + step);
      Attempt trial = attempt(assembler, last.state.copy(), next, options);
      iterations += trial.iterations;
      if (trial.stands()) {
        last = trial;
        reached = next;
      } else {
        step /= 2;
        if (step < least) {
          throw failure(assembler, trial, reached);
        }
      }
    }
    // the assembler holds the last state assembled, which may be a failed trial
    assembler.assemble(last.state, toFactor, false);
    return new Equilibrium(assembler, last.state, toFactor, iterations, last.negativePivots);
  }

  /** One go at a load: what came of it. */
  static final class Attempt {
    final ChainState state;
    final boolean found;
    final int iterations;
    final int negativePivots;
    final int node;

    Attempt(ChainState state, boolean found, int iterations, int negativePivots, int node) {
      this.state = state;
      this.found = found;
      this.iterations = iterations;
      this.negativePivots = negativePivots;
      this.node = node;
    }

    /** Whether a stable balance was found. */
    boolean stands() {
      return found && negativePivots == 0;
    }

    Equilibrium result(Assembler assembler, double factor) {
      return new Equilibrium(assembler, state, factor, iterations, negativePivots);
    }
  }

  /** Newton's method at one factor; {@code state} is modified. */
  static Attempt attempt(Assembler a, ChainState state, double factor, Options options) {
    double[] step = new double[a.unbalanced.length];
    double before = Double.POSITIVE_INFINITY;
    for (int i = 1; i <= options.mostIterations(); i++) {
      try {
        a.assemble(state, factor, true);
      } catch (EquilibriumException lost) {
        return new Attempt(state, false, i, 0, a.worstNode());
      }
      a.tangent.factor();
      double residual = a.residual_N();
      if (!Double.isFinite(residual)) {
        return new Attempt(state, false, i, 0, a.worstNode());
      }
      boolean stalled = residual < 1e-7 * a.greatest_N && residual > 0.5 * before;
      if (residual <= options.toleranceRatio() * a.greatest_N || stalled) {
        int node = Math.max(a.tangent.firstNegative(), 0);
        return new Attempt(state, true, i, a.tangent.negativePivots(), node);
      }
      if (i > options.patienceIterations() && a.tangent.negativePivots() > 0) {
        return new Attempt(
            state, false, i, a.tangent.negativePivots(), Math.max(a.tangent.firstNegative(), 0));
      }
      before = residual;
      System.arraycopy(a.unbalanced, 0, step, 0, step.length);
      a.tangent.solve(step);
      limit(step);
      search(a, state, factor, step);
    }
    return new Attempt(state, false, options.mostIterations(), 0, a.worstNode());
  }

  private static void limit(double[] step) {
    double most = 0;
    for (int i = 0; i < step.length; i++) {
      if (i % 6 >= 3) {
        most = Math.max(most, Math.abs(step[i]));
      }
    }
    if (most > MOST_SPIN_RAD) {
      for (int i = 0; i < step.length; i++) {
        step[i] *= MOST_SPIN_RAD / most;
      }
    }
  }

  /** Moves along a step, a whole one where that lessens the unbalanced work, else less. */
  private static void search(Assembler a, ChainState state, double factor, double[] step) {
    double start = work(step, a.unbalanced);
    double residual = a.residual_N();
    double share = 1;
    ChainState best = null;
    for (int i = 0; i < MOST_HALVINGS; i++) {
      ChainState trial = state.copy();
      trial.move(step, share);
      if (balances(a, trial, factor)
          && (Math.abs(work(step, a.unbalanced)) <= 0.8 * Math.abs(start)
              || a.residual_N() < residual)) {
        best = trial;
        break;
      }
      share /= 2;
    }
    if (best == null) {
      state.move(step, share);
      return;
    }
    System.arraycopy(best.place_m, 0, state.place_m, 0, best.place_m.length);
    System.arraycopy(best.rotation, 0, state.rotation, 0, best.rotation.length);
    System.arraycopy(best.cableGuess_N, 0, state.cableGuess_N, 0, best.cableGuess_N.length);
  }

  private static boolean balances(Assembler a, ChainState trial, double factor) {
    try {
      a.assemble(trial, factor, false);
      return true;
    } catch (EquilibriumException lost) {
      return false;
    }
  }

  private static double work(double[] step, double[] force) {
    double sum = 0;
    for (int i = 0; i < step.length; i++) {
      sum += step[i] * force[i];
    }
    return sum;
  }

  static EquilibriumException failure(Assembler a, Attempt attempt, double reached) {
    boolean unstable = attempt.found;
    EquilibriumException.Cause cause =
        reached == 0 && unstable
            ? EquilibriumException.Cause.MECHANISM
            : unstable || reached > 0
                ? EquilibriumException.Cause.LIMIT_POINT
                : EquilibriumException.Cause.NO_CONVERGENCE;
    String what =
        unstable
            ? "the balance is not stable (" + attempt.negativePivots + " negative pivots)"
            : "no balance was found";
    return new EquilibriumException(
        cause,
        attempt.node,
        attempt.iterations,
        what
            + " beyond "
            + reached
            + " of the variable loads, node "
            + attempt.node
            + ", after "
            + attempt.iterations
            + " iterations");
  }
}
