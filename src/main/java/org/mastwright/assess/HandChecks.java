package org.mastwright.assess;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.mastwright.design.Design;
import org.mastwright.forces.SectionForces;
import org.mastwright.units.Unit;
import org.mastwright.working.Check;
import org.mastwright.working.Clause;
import org.mastwright.working.Derivation;
import org.mastwright.working.Status;
import org.mastwright.working.Step;

/** The governing tube, followed from its forces to its utilisation so that a pencil can follow. */
final class HandChecks {
  private static final Clause STATICS =
      new Clause("statics", "-", "moments of a free body", Status.PRACTICE);

  private HandChecks() {}

  static Optional<Derivation> of(Design design, List<SolvedCase> cases, List<Check> checks) {
    Optional<Check> tube =
        checks.stream()
            .filter(c -> c.subject().id().equals("tube-strength") && c.utilisation().isPresent())
            .max(Comparator.comparingDouble(c -> c.utilisation().getAsDouble()));
    if (tube.isEmpty()) {
      return Optional.empty();
    }
    Optional<SolvedCase> found =
        cases.stream()
            .filter(s -> s.response().mark().id().equals(tube.get().subject().caseId()))
            .findFirst();
    return found.map(s -> derivation(design, s, tube.get()));
  }

  private static Derivation derivation(Design design, SolvedCase solved, Check tube) {
    double used = tube.working().get(tube.working().size() - 1).inputs().get(0).si();
    List<Step> steps = new ArrayList<>();
    SectionForces at =
        solved.response().stations().stream()
            .min(
                Comparator.comparingDouble(
                    s ->
                        Math.min(
                            Math.abs(s.moment_Nm() - used),
                            Math.abs(Math.abs(s.axial_N()) - used))))
            .orElseThrow();
    double byStatics = Statics.of(design, solved).momentAt_Nm(at);
    steps.add(Step.given("M", "from the beams, second order", at.moment_Nm(), Unit.KNM, STATICS));
    steps.add(
        Step.given(
            "M",
            "the same by moments of every force above, on the deformed shape",
            byStatics,
            Unit.KNM,
            STATICS));
    steps.add(Step.given("N", "from the beams, tension positive", at.axial_N(), Unit.KN, STATICS));
    steps.addAll(tube.working());
    return new Derivation(
        "Tube at " + tube.subject().where() + ", case " + tube.subject().caseId(),
        "Forces from two methods, then the section line by line.",
        steps);
  }
}
