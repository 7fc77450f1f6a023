package org.mastwright.assess;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.loads.Combination;
import org.mastwright.loads.LoadCase;

/**
 * Solves every combination in every direction and variant, refines round the worst directions and
 * looks for the limit point of the worst strength cases. Cases run in parallel and are gathered by
 * index, so that the result does not depend on the order of arrival.
 */
final class CaseRunner {
  /** Half of the 15° between the directions that are always run. */
  private static final double REFINEMENT_RAD = Math.toRadians(7.5);

  /** Directions nearer than this count as one. */
  private static final double SAME_RAD = 1e-6;

  /**
   * The limit-point search ends here: a tower that holds three times the factored wind is stiff.
   */
  static final double LIMIT_CAP_FACTOR = 3.0;

  /** What the runner needs of the mast. */
  interface Solver {
    Response solve(LoadCase loads);

    Response solveWithLimit(LoadCase loads, double capFactor);
  }

  private record Job(Combination combination, Combination.Variant variant, double windFrom_rad) {
    LoadCase loads() {
      return combination.at(windFrom_rad, variant);
    }
  }

  /** What makes a case the worst of its kind. */
  private static final List<ToDoubleFunction<Response>> MEASURES =
      List.of(
          r -> r.converged() ? 0 : 1 / r.reachedFactor(),
          r -> r.greatestMoment().moment_Nm(),
          CaseRunner::greatestGuy_N,
          r -> r.top().level_m());

  private final Solver solver;
  private final Progress progress;

  CaseRunner(Solver solver, Progress progress) {
    this.solver = solver;
    this.progress = progress;
  }

  /** All cases in order of combination, direction and variant. */
  List<SolvedCase> run(List<Combination> combinations, List<Double> directions_rad) {
    List<SolvedCase> all = new ArrayList<>();
    for (Combination combination : combinations) {
      all.addAll(run(combination, directions_rad));
    }
    return List.copyOf(all);
  }

  private List<SolvedCase> run(Combination combination, List<Double> directions_rad) {
    List<Double> first = combination.directional() ? directions_rad : directions_rad.subList(0, 1);
    List<SolvedCase> coarse = solve(jobs(combination, first), combination.title(), this::solved);
    if (!combination.directional()) {
      return coarse;
    }
    List<Double> finer = finer(coarse, first);
    List<SolvedCase> all = new ArrayList<>(coarse);
    all.addAll(solve(jobs(combination, finer), combination.title(), this::solved));
    all.sort(
        Comparator.comparingDouble((SolvedCase s) -> s.response().mark().windFrom_rad())
            .thenComparing(s -> s.response().mark().id()));
    return combination.limitState() == LimitState.STRENGTH ? withLimits(all) : all;
  }

  private static List<Job> jobs(Combination combination, List<Double> directions_rad) {
    List<Job> jobs = new ArrayList<>();
    for (double direction : directions_rad) {
      for (Combination.Variant variant : combination.variants()) {
        jobs.add(new Job(combination, variant, direction));
      }
    }
    return jobs;
  }

  private SolvedCase solved(Job job) {
    LoadCase loads = job.loads();
    return new SolvedCase(loads, solver.solve(loads));
  }

  private <T> List<SolvedCase> solve(List<T> work, String words, Function<T, SolvedCase> solution) {
    AtomicInteger done = new AtomicInteger();
    SolvedCase[] out = new SolvedCase[work.size()];
    IntStream.range(0, work.size())
        .parallel()
        .forEach(
            i -> {
              out[i] = solution.apply(work.get(i));
              progress.stage(words.toLowerCase(Locale.ROOT), done.incrementAndGet(), work.size());
            });
    return List.of(out);
  }

  /** Directions half a step to either side of each measure's worst, that were not run yet. */
  private static List<Double> finer(List<SolvedCase> cases, List<Double> known) {
    Set<Double> finer = new TreeSet<>();
    for (SolvedCase worst : worstOf(cases)) {
      double from = worst.response().mark().windFrom_rad();
      for (double side : new double[] {-REFINEMENT_RAD, REFINEMENT_RAD}) {
        double direction = (from + side + 2 * Math.PI) % (2 * Math.PI);
        if (isNew(direction, known) && isNew(direction, finer)) {
          finer.add(direction);
        }
      }
    }
    return List.copyOf(finer);
  }

  private static boolean isNew(double direction, Iterable<Double> known) {
    for (double other : known) {
      double apart = Math.abs(direction - other);
      if (Math.min(apart, 2 * Math.PI - apart) < SAME_RAD) {
        return false;
      }
    }
    return true;
  }

  private static Set<SolvedCase> worstOf(List<SolvedCase> cases) {
    Set<SolvedCase> worst = new LinkedHashSet<>();
    for (ToDoubleFunction<Response> measure : MEASURES) {
      Optional<SolvedCase> most =
          cases.stream().max(Comparator.comparingDouble(s -> measure.applyAsDouble(s.response())));
      most.ifPresent(worst::add);
    }
    return worst;
  }

  private List<SolvedCase> withLimits(List<SolvedCase> cases) {
    List<SolvedCase> worst = List.copyOf(worstOf(cases));
    List<SolvedCase> limited =
        solve(
            worst,
            "limit points",
            s -> new SolvedCase(s.loads(), solver.solveWithLimit(s.loads(), LIMIT_CAP_FACTOR)));
    List<SolvedCase> all = new ArrayList<>(cases);
    for (int i = 0; i < worst.size(); i++) {
      all.set(all.indexOf(worst.get(i)), limited.get(i));
    }
    return List.copyOf(all);
  }

  private static double greatestGuy_N(Response response) {
    return response.guys().stream().mapToDouble(GuyForces::greatest_N).max().orElse(0);
  }
}
