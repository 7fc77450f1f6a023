package org.mastwright.assess;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import org.mastwright.assess.Reactions.AnchorPull;
import org.mastwright.assess.Reactions.FootReaction;
import org.mastwright.assess.Reactions.GuyEnd;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.forces.BaseReaction;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.forces.Vector3;

/** What the ground must hold: the notable reactions at the foot and the greatest anchor pulls. */
final class ReactionTables {
  private ReactionTables() {}

  static Reactions of(Design design, List<Response> responses) {
    return new Reactions(foot(responses), anchors(design, responses));
  }

  private static List<FootReaction> foot(List<Response> responses) {
    List<Response> strength = of(responses, LimitState.STRENGTH);
    List<FootReaction> rows = new ArrayList<>();
    if (!strength.isEmpty()) {
      rows.add(row("greatest push down", strength, responses, BaseReaction::up_N));
      rows.add(row("least push down", strength, responses, b -> -b.up_N()));
      rows.add(row("greatest level force", strength, responses, BaseReaction::shear_N));
      rows.add(row("greatest moment", strength, responses, BaseReaction::moment_Nm));
      rows.add(row("greatest twist", strength, responses, b -> Math.abs(b.torque_Nm())));
    }
    return rows;
  }

  private static FootReaction row(
      String what,
      List<Response> strength,
      List<Response> all,
      ToDoubleFunction<BaseReaction> measure) {
    Response worst = greatest(strength, r -> measure.applyAsDouble(r.base()));
    return new FootReaction(
        what, worst.mark().id(), worst.base(), unfactoredTwin(worst, all).base());
  }

  /** The case of the same actions and direction without factors, with the greatest level force. */
  private static Response unfactoredTwin(Response factored, List<Response> all) {
    String code = factored.mark().combination() + "k";
    Optional<Response> twin =
        all.stream()
            .filter(r -> r.mark().combination().equals(code))
            .min(
                Comparator.comparingDouble(
                        (Response r) ->
                            apart(r.mark().windFrom_rad(), factored.mark().windFrom_rad()))
                    .thenComparing(r -> -r.mark().thrust_N()));
    return twin.orElse(factored);
  }

  private static double apart(double a_rad, double b_rad) {
    double apart = Math.abs(a_rad - b_rad) % (2 * Math.PI);
    return Math.min(apart, 2 * Math.PI - apart);
  }

  private static List<AnchorPull> anchors(Design design, List<Response> responses) {
    List<AnchorPull> pulls = new ArrayList<>();
    List<Ground.Anchor> anchors = design.ground().anchors();
    List<Response> strength = of(responses, LimitState.STRENGTH);
    List<Response> plain = of(responses, LimitState.CHARACTERISTIC);
    if (strength.isEmpty()) {
      return pulls;
    }
    for (int i = 0; i < anchors.size(); i++) {
      int anchor = i;
      Response worst = greatest(strength, r -> pull(r, anchor).length());
      Response mild = plain.isEmpty() ? worst : greatest(plain, r -> pull(r, anchor).length());
      pulls.add(
          new AnchorPull(
              anchors.get(i).name(),
              guyEnds(design, i),
              pull(worst, i),
              worst.mark().id(),
              pull(mild, i),
              mild.mark().id()));
    }
    return pulls;
  }

  /** The vector sum of the guys that end at an anchor. */
  static Vector3 pull(Response response, int anchor) {
    Vector3 sum = Vector3.ZERO;
    for (GuyForces g : response.guys()) {
      if (g.anchor() == anchor) {
        sum = sum.plus(g.anchorPull_N());
      }
    }
    return sum;
  }

  private static List<GuyEnd> guyEnds(Design design, int anchor) {
    List<GuyEnd> ends = new ArrayList<>();
    for (GuySet set : design.tower().guys()) {
      for (GuySet.Guy guy : set.guys()) {
        if (guy.anchor() == anchor) {
          ends.add(new GuyEnd(set.number(), guy.azimuth_rad()));
        }
      }
    }
    return ends;
  }

  private static List<Response> of(List<Response> responses, LimitState state) {
    return responses.stream().filter(r -> r.mark().limitState() == state).toList();
  }

  private static Response greatest(List<Response> responses, ToDoubleFunction<Response> measure) {
    return responses.stream().max(Comparator.comparingDouble(measure)).orElseThrow();
  }
}
