package org.mastwright.checks.clearance;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.mastwright.design.Design;
import org.mastwright.design.Rotor;
import org.mastwright.design.Surroundings;
import org.mastwright.design.Turbine;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.forces.TopMovement;
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

/** Lean, blades against guys in every yaw direction, blade height, and what stands around. */
public final class ClearanceChecks {
  private static final double LEAST_CLEARANCE_M = 0.3;
  private static final double MOST_LEAN_RAD = Math.toRadians(5);
  private static final double LINE_FACTOR = 1.5;
  private static final int PIECES = 16;

  private static Clause practice(String what) {
    return new Clause("common practice", "-", what, Status.PRACTICE);
  }

  static final Formula FALL =
      new Formula(
          "d_req",
          Unit.M,
          "{k}·{h}",
          practice("distance in proportion to the total height"),
          List.of(new Var("k", Unit.ONE), new Var("h", Unit.M)),
          v -> v[0] * v[1]);

  private ClearanceChecks() {}

  /**
   * All of them.
   *
   * @param height_m of the highest blade tip
   * @param lowestBlade_m of the lowest blade tip
   */
  public static List<Check> of(
      Design design, List<Response> responses, double height_m, double lowestBlade_m) {
    List<Check> checks = new ArrayList<>();
    lean(responses).ifPresent(checks::add);
    bladeToGuy(design, responses).ifPresent(checks::add);
    surroundings(design.surroundings(), height_m, lowestBlade_m, checks);
    return checks;
  }

  private static Optional<Check> lean(List<Response> responses) {
    Clause clause = practice("lean of the mast top at most 5° in the one-year wind");
    return responses.stream()
        .filter(r -> r.mark().limitState() == LimitState.SERVICE)
        .max(java.util.Comparator.comparingDouble(r -> r.top().tilt_rad()))
        .map(
            r -> {
              Step demand =
                  Step.given("θ", "lean at the top", r.top().tilt_rad(), Unit.DEG, clause);
              Step limit = Step.given("θ_max", "agreed limit", MOST_LEAN_RAD, Unit.DEG, clause);
              Subject subject =
                  new Subject(
                      "top-lean",
                      "Does the top lean too far?",
                      Question.CLEARANCE,
                      "mast top",
                      r.mark().id());
              return new Check.Limit(
                  subject, clause, demand, limit, List.of(demand, limit), List.of());
            });
  }

  /** The nearest a blade comes to a guy, whichever way the head is turned. */
  private record Nearest(Response response, GuyForces guy, double distance_m) {}

  private static Optional<Check> bladeToGuy(Design design, List<Response> responses) {
    if (design.turbine().isEmpty() || design.turbine().get().rotor().kind().isUpright()) {
      return Optional.empty();
    }
    Nearest nearest = null;
    for (Response r : responses) {
      if (r.mark().limitState() == LimitState.SERVICE
          || r.mark().limitState() == LimitState.CHARACTERISTIC) {
        for (GuyForces g : r.guys()) {
          if (!g.removed()) {
            double d = distance_m(design, r.top(), g);
            if (nearest == null || d < nearest.distance_m) {
              nearest = new Nearest(r, g, d);
            }
          }
        }
      }
    }
    return Optional.ofNullable(nearest).map(ClearanceChecks::bladeCheck);
  }

  private static Check bladeCheck(Nearest n) {
    Clause clause = practice("blades at least 0.3 m from every guy, in every yaw direction");
    Step required = Step.given("c_req", "agreed least", LEAST_CLEARANCE_M, Unit.M, clause);
    Step found =
        Step.given(
            "c",
            "from the space swept by the blades in all yaw directions to the guy, both moved",
            n.distance_m,
            Unit.M,
            clause);
    Subject subject =
        new Subject(
            "blade-guy-clearance",
            "Do the blades keep clear of the guys?",
            Question.CLEARANCE,
            "guy of level " + n.guy.set() + " at " + Unit.DEG.print(n.guy.azimuth_rad()),
            n.response.mark().id(),
            "A blade that touches a guy parts it, and the mast follows.");
    return new Check.Separation(
        subject, clause, required, found, List.of(required, found), List.of());
  }

  /**
   * Whichever way the head is turned, tilted or leaning, every blade tip keeps one distance from
   * the point where the shaft meets the tower axis: {@code √((R cos β)² + (o + R sin β)²)} with
   * overhang {@code o} and cone {@code β}, taken outwards. The space swept is that sphere. The
   * point lies {@code o sin τ} below the hub under the tilt {@code τ}. Blades are taken as stiff.
   *
   * @return distance from the sphere to the guy, both moved; negative when the guy is inside
   */
  static double distance_m(Design design, TopMovement top, GuyForces guy) {
    Turbine turbine = design.turbine().orElseThrow();
    Rotor rotor = turbine.rotor();
    double radius = reach_m(rotor.radius_m(), rotor.overhang_m(), rotor.cone_rad());
    double above = turbine.head().hubAboveTop_m() - rotor.overhang_m() * Math.sin(rotor.tilt_rad());
    double lean = above * Math.sin(top.tilt_rad());
    Vector3 centre =
        new Vector3(
            top.east_m() + lean * Math.sin(top.tiltTowards_rad()),
            top.north_m() + lean * Math.cos(top.tiltTowards_rad()),
            design.tower().topHeight_m() + top.up_m() + above * Math.cos(top.tilt_rad()));
    double least = Double.POSITIVE_INFINITY;
    List<Vector3> shape = guy.shape_m();
    for (int i = 1; i < shape.size(); i++) {
      for (int p = 0; p <= PIECES; p++) {
        double t = (double) p / PIECES;
        Vector3 at = shape.get(i - 1).times(1 - t).plus(shape.get(i).times(t));
        least = Math.min(least, at.minus(centre).length() - radius);
      }
    }
    return least;
  }

  /** Distance of a blade tip from the point where the shaft meets the tower axis. */
  static double reach_m(double radius_m, double overhang_m, double cone_rad) {
    return Math.hypot(
        radius_m * Math.cos(cone_rad), overhang_m + radius_m * Math.sin(Math.abs(cone_rad)));
  }

  private static void surroundings(
      Surroundings s, double height_m, double lowestBlade_m, List<Check> checks) {
    if (s.lowestBladeRule_m().isPresent()) {
      checks.add(
          separation(
              "blade-height",
              "Are the blades high enough above the ground?",
              "lowest blade tip",
              Step.given(
                  "z_req",
                  "local rule",
                  s.lowestBladeRule_m().getAsDouble(),
                  Unit.M,
                  practice("local rule")),
              Step.given("z", "lowest blade tip", lowestBlade_m, Unit.M, practice("geometry"))));
    }
    double multiplier = s.setback().map(Surroundings.Setback::multiplierFactor).orElse(1.0);
    for (Surroundings.LotLine line : s.lotLines()) {
      checks.add(
          separation(
              "fall-circle",
              "Does it fall within its own ground?",
              "boundary at " + Unit.DEG.print(line.bearing_rad()),
              FALL.at(multiplier, height_m),
              Step.given("d", "to the boundary", line.distance_m(), Unit.M, practice("geometry"))));
    }
    if (s.overheadLine_m().isPresent()) {
      checks.add(
          separation(
              "overhead-line",
              "Is it far enough from power lines?",
              "nearest power line",
              FALL.at(LINE_FACTOR, height_m),
              Step.given(
                  "d",
                  "to the line",
                  s.overheadLine_m().getAsDouble(),
                  Unit.M,
                  practice("geometry"))));
    } else {
      checks.add(
          new Check.NotAssessed(
              subject("overhead-line", "Is it far enough from power lines?", "nearest power line"),
              practice("distance in proportion to the total height"),
              "The distance to the nearest power line is not given; it must be at least "
                  + Unit.M.print(LINE_FACTOR * height_m)
                  + ".",
              List.of(),
              List.of()));
    }
  }

  private static Subject subject(String id, String title, String where) {
    return new Subject(
        id, title, Question.AROUND, where, "-", "Whoever stands there when it falls is struck.");
  }

  private static Check separation(
      String id, String title, String where, Step required, Step found) {
    return new Check.Separation(
        subject(id, title, where),
        required.clause(),
        required,
        found,
        List.of(required, found),
        List.of());
  }
}
