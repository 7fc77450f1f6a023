package org.mastwright.checks.joint;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.mastwright.design.Design;
import org.mastwright.design.Joint;
import org.mastwright.forces.BaseReaction;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.forces.SectionForces;
import org.mastwright.units.Unit;
import org.mastwright.working.Check;
import org.mastwright.working.Clause;
import org.mastwright.working.Question;
import org.mastwright.working.Status;
import org.mastwright.working.Subject;

/** Joints and footing: what they must bear. Their own strength is not calculated here. */
public final class JointChecks {
  private static final Clause CLAUSE =
      new Clause(
          "to be checked by the engineer", "-", "EN 1993-1-8 or AISC 360 J", Status.PRACTICE);

  private JointChecks() {}

  /** One entry per joint, one for tube ends without a joint, one for the footing. */
  public static List<Check> of(Design design, List<Response> responses) {
    List<Response> strength =
        responses.stream().filter(r -> r.mark().limitState() == LimitState.STRENGTH).toList();
    List<Check> checks = new ArrayList<>();
    for (Joint joint : design.tower().joints()) {
      boolean foot = joint.kind() == Joint.Kind.BASE_PLATE;
      worstAt(strength, joint.along_m())
          .ifPresent(
              w ->
                  checks.add(
                      notAssessed(
                          foot ? "base-plate" : "joint-strength",
                          foot ? "Do foot plate and bolts hold?" : "Does the joint hold?",
                          foot ? Question.FOOT : Question.TUBE,
                          joint.kind().key() + " at " + Unit.M.print(w.forces.height_m()),
                          w.response.mark().id(),
                          "The strength of joints is not calculated here; it must bear "
                              + words(w.forces)
                              + ", factored.")));
    }
    for (int i = 0; i < design.tower().tubes().size() - 1; i++) {
      double end = design.tower().tubes().get(i).top_m();
      boolean known =
          design.tower().joints().stream().anyMatch(j -> Math.abs(j.along_m() - end) < 0.01);
      if (!known) {
        worstAt(strength, end)
            .ifPresent(
                w ->
                    checks.add(
                        notAssessed(
                            "joint-strength",
                            "Does the joint hold?",
                            Question.TUBE,
                            "tube end at " + Unit.M.print(w.forces.height_m()),
                            w.response.mark().id(),
                            "No joint is described where two tubes meet; it must bear "
                                + words(w.forces)
                                + ", factored.")));
      }
    }
    footing(strength).ifPresent(checks::add);
    return checks;
  }

  private record Worst(Response response, SectionForces forces) {}

  private static Optional<Worst> worstAt(List<Response> responses, double along_m) {
    return responses.stream()
        .flatMap(
            r ->
                r.stations().stream()
                    .filter(f -> Math.abs(f.along_m() - along_m) < 0.01)
                    .map(f -> new Worst(r, f)))
        .max(Comparator.comparingDouble(w -> w.forces.moment_Nm() - 1e-3 * w.forces.axial_N()));
  }

  private static String words(SectionForces f) {
    return Unit.KNM.print(f.moment_Nm())
        + " bending, "
        + Unit.KN.print(-f.axial_N())
        + " push, "
        + Unit.KN.print(f.shear_N())
        + " shear";
  }

  private static Optional<Check> footing(List<Response> strength) {
    return strength.stream()
        .max(Comparator.comparingDouble(r -> r.base().moment_Nm() + r.base().up_N()))
        .map(
            r -> {
              BaseReaction b = r.base();
              return notAssessed(
                  "footing-strength",
                  "Will the footing hold?",
                  Question.FOOTING,
                  "footing of the mast",
                  r.mark().id(),
                  "Footings are not calculated here; it must bear "
                      + Unit.KN.print(b.up_N())
                      + " down, "
                      + Unit.KN.print(b.shear_N())
                      + " level and "
                      + Unit.KNM.print(b.moment_Nm())
                      + ", factored.");
            });
  }

  private static Check notAssessed(
      String id, String title, Question question, String where, String caseId, String reason) {
    return new Check.NotAssessed(
        new Subject(id, title, question, where, caseId), CLAUSE, reason, List.of(), List.of());
  }
}
