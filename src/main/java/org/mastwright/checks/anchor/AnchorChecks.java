package org.mastwright.checks.anchor;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.forces.Vector3;
import org.mastwright.units.Unit;
import org.mastwright.working.Check;
import org.mastwright.working.Clause;
import org.mastwright.working.Formula;
import org.mastwright.working.Formula.Var;
import org.mastwright.working.Question;
import org.mastwright.working.Status;
import org.mastwright.working.Step;
import org.mastwright.working.Subject;

/** Anchors: the vector sum of the guys that end there against what a tested one has held. */
public final class AnchorChecks {
  private static final double IEC_GAMMA_M = 1.1;
  private static final Clause CLAUSE =
      new Clause("common practice with IEC 61400-2 factors", "-", "soil at 1/1.1", Status.PRACTICE);

  static final Formula TESTED =
      new Formula(
          "R_d",
          Unit.KN,
          "{R_test}/{γ_m}",
          CLAUSE,
          List.of(new Var("R_test", Unit.KN), new Var("γ_m", Unit.ONE)),
          v -> v[0] / v[1]);

  private AnchorChecks() {}

  /** The pull of all guys that end at an anchor. */
  public static Vector3 pull_N(Response response, int anchor) {
    Vector3 sum = Vector3.ZERO;
    for (GuyForces g : response.guys()) {
      if (g.anchor() == anchor) {
        sum = sum.plus(g.anchorPull_N());
      }
    }
    return sum;
  }

  /** One check per anchor that a guy ends at. */
  public static List<Check> of(Design design, List<Response> responses) {
    List<Check> checks = new ArrayList<>();
    List<Ground.Anchor> anchors = design.ground().anchors();
    for (int i = 0; i < anchors.size(); i++) {
      Response worst = null;
      for (Response r : responses) {
        boolean counts = r.mark().limitState() == LimitState.STRENGTH;
        if (counts && (worst == null || pull_N(r, i).length() > pull_N(worst, i).length())) {
          worst = r;
        }
      }
      if (worst != null && pull_N(worst, i).length() > 0) {
        checks.add(check(anchors.get(i), pull_N(worst, i), worst));
      }
    }
    return checks;
  }

  private static Check check(Ground.Anchor anchor, Vector3 pull_N, Response worst) {
    double size = pull_N.length();
    String direction =
        "towards "
            + Unit.DEG.print(pull_N.bearing_rad())
            + ", "
            + Unit.DEG.print(Math.atan2(pull_N.up(), pull_N.level()))
            + " above level";
    Step demand = Step.given("F_Ed", "pull " + direction, size, Unit.KN, CLAUSE);
    Subject subject =
        new Subject(
            "anchor-capacity",
            "Does the anchor hold its guys?",
            Question.ANCHORS,
            "anchor " + anchor.name() + ", " + anchor.kind().key(),
            worst.mark().id(),
            "An anchor that comes out lets the whole tower fall.");
    if (anchor.kind() instanceof Ground.Kind.Tested t && !t.failed()) {
      Step capacity = TESTED.at(t.held_N(), IEC_GAMMA_M);
      return new Check.Limit(
          subject, CLAUSE, demand, capacity, List.of(demand, capacity), List.of());
    }
    String reason =
        anchor.kind() instanceof Ground.Kind.Tested
            ? "The anchor gave way in its test; it must hold "
            : "What an anchor of this kind can hold is not calculated here; it must hold ";
    return new Check.NotAssessed(
        subject,
        CLAUSE,
        reason + Unit.KN.print(size) + " " + direction + ", factored.",
        List.of(demand),
        List.of());
  }
}
