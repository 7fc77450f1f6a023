package org.mastwright.checks.member;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.mastwright.design.Basis;
import org.mastwright.design.Design;
import org.mastwright.design.GuySet;
import org.mastwright.design.Tower;
import org.mastwright.design.Tube;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.forces.SectionForces;
import org.mastwright.units.Unit;
import org.mastwright.working.Check;
import org.mastwright.working.Clause;
import org.mastwright.working.Finding;
import org.mastwright.working.Question;
import org.mastwright.working.Status;
import org.mastwright.working.Step;
import org.mastwright.working.Subject;

/** Every tube at its worst place in its worst case, and the stability of the whole. */
public final class TubeChecks {
  /** Material factor of IEC 61400-2 for a fully characterised material, on the yield strength. */
  private static final double IEC_GAMMA_M = 1.1;

  private static final double FLAGGED_FACTOR = 1.15;

  private TubeChecks() {}

  /** A tube's worst place. */
  private record Worst(Response response, SectionForces forces, double utilisation) {}

  private interface Measure {
    double of(Tube tube, SectionForces forces);
  }

  /** Strength and shear of each tube, and the limit point, from the strength cases. */
  public static List<Check> of(Design design, List<Response> responses) {
    List<Response> strength =
        responses.stream().filter(r -> r.mark().limitState() == LimitState.STRENGTH).toList();
    List<Check> checks = new ArrayList<>();
    boolean en = design.basis().map(b -> b.strength() == Basis.StrengthBasis.EN_1993).orElse(true);
    for (Tube tube : design.tower().tubes()) {
      double span_m = longestSpan(design.tower(), tube);
      Measure measure =
          en
              ? (t, f) -> EnTube.utilisation(t, f, IEC_GAMMA_M)
              : (t, f) -> AiscTube.utilisation(t, f, span_m);
      worst(tube, strength, measure).ifPresent(w -> checks.add(strength(tube, w, en, span_m)));
      worst(tube, strength, (t, f) -> f.shear_N() / t.sectionAt(f.along_m()).area_m2())
          .ifPresent(w -> checks.add(shear(tube, w, en)));
    }
    limit(strength).ifPresent(checks::add);
    return checks;
  }

  /** The longest part of the mast between guys that the tube belongs to; all of a monopole. */
  private static double longestSpan(Tower tower, Tube tube) {
    double from = 0;
    double longest = 0;
    List<Double> ends = new ArrayList<>();
    for (GuySet set : tower.guys()) {
      ends.add(set.along_m());
    }
    ends.add(tower.length_m());
    for (double to : ends) {
      if (to > tube.bottom_m() && from < tube.top_m()) {
        longest = Math.max(longest, to - from);
      }
      from = to;
    }
    return longest;
  }

  private static Optional<Worst> worst(Tube tube, List<Response> responses, Measure measure) {
    Worst worst = null;
    for (Response r : responses) {
      for (SectionForces f : r.stations()) {
        if (f.along_m() >= tube.bottom_m() - 1e-9 && f.along_m() <= tube.top_m() + 1e-9) {
          double u = measure.of(tube, f);
          if (worst == null || !(u <= worst.utilisation)) {
            worst = new Worst(r, f, u);
          }
        }
      }
    }
    return Optional.ofNullable(worst);
  }

  private static String place(Tube tube, SectionForces f) {
    return tube.label() + ", " + Unit.M.print(f.height_m()) + " up";
  }

  private static Check strength(Tube tube, Worst w, boolean en, double span_m) {
    Subject subject =
        new Subject(
            "tube-strength",
            "Does the tube bear bending with push?",
            Question.TUBE,
            place(tube, w.forces),
            w.response.mark().id());
    return en
        ? EnTube.strength(tube, w.forces, IEC_GAMMA_M, subject, List.of())
        : AiscTube.strength(tube, w.forces, span_m, subject, List.of());
  }

  private static Check shear(Tube tube, Worst w, boolean en) {
    Subject subject =
        new Subject(
            "tube-shear",
            "Does the tube bear shear with twist?",
            Question.TUBE,
            place(tube, w.forces),
            w.response.mark().id());
    return en
        ? EnTube.shear(tube, w.forces, IEC_GAMMA_M, subject, List.of())
        : AiscTube.shear(tube, w.forces, subject, List.of());
  }

  /** The least factor on the variable actions at which a case loses its balance. */
  private static Optional<Check> limit(List<Response> strength) {
    Response worst = null;
    for (Response r : strength) {
      if (r.limit().isPresent()
          && (worst == null || r.limit().get().factor() < worst.limit().get().factor())) {
        worst = r;
      }
    }
    return Optional.ofNullable(worst).map(TubeChecks::limit);
  }

  private static Check limit(Response worst) {
    Clause clause =
        new Clause("EN 1993-1-1", "2005", "5.2.2, second order at factored loads", Status.RECALLED);
    double factor = worst.limit().get().factor();
    String words =
        worst.limit().get().lost().isPresent()
            ? "no equilibrium at "
                + Unit.ONE.print(worst.limit().get().lost().getAsDouble())
                + " times the factored variable actions"
            : "still standing at the end of the search";
    Step capacity = Step.given("λ_lim", words, Math.max(factor, 1e-6), Unit.ONE, clause);
    Step demand = Step.given("λ", "the factored actions themselves", 1, Unit.ONE, clause);
    List<Finding> findings = new ArrayList<>();
    if (!worst.converged()) {
      findings.add(
          Finding.of(
              "no-equilibrium",
              Finding.Severity.WARNING,
              worst.mark().id()
                  + ": no equilibrium under the factored loads; the forces shown are those of the"
                  + " last equilibrium, at "
                  + Unit.ONE.print(worst.reachedFactor())
                  + " of the variable actions.",
              "Stiffen the mast, tighten or add guys."));
    } else if (factor < FLAGGED_FACTOR) {
      findings.add(
          Finding.of(
              "limit-near",
              Finding.Severity.WARNING,
              "The tower loses its balance less than 15 % above the factored loads.",
              "Small errors matter here: have the model reviewed."));
    }
    Subject subject =
        new Subject(
            "stability-limit",
            "Does the tower keep its balance under factored loads?",
            Question.TUBE,
            "whole tower",
            worst.mark().id(),
            "Past this load no position is in balance: the tower folds.");
    return new Check.Limit(subject, clause, demand, capacity, List.of(demand, capacity), findings);
  }
}
