package org.mastwright.checks.guy;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.Design;
import org.mastwright.design.GuySet;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.units.Unit;
import org.mastwright.working.Check;
import org.mastwright.working.Clause;
import org.mastwright.working.Formula;
import org.mastwright.working.Formula.Var;
import org.mastwright.working.Question;
import org.mastwright.working.Status;
import org.mastwright.working.Step;
import org.mastwright.working.Subject;

/** Guys, their ends and what hangs in their line; slackness while the rotor runs. */
public final class GuyChecks {
  private static final double IEC_GAMMA_M = 1.1;
  private static final double SLACK_FRACTION = 0.10;

  private static final Clause IEC =
      new Clause("IEC 61400-2", "2013", "7.9, material factor", Status.RECALLED);

  static final Formula RESISTANCE =
      new Formula(
          "F_Rd",
          Unit.KN,
          "{k_e}·{F_uk}/{γ_m}",
          IEC,
          List.of(new Var("k_e", Unit.ONE), new Var("F_uk", Unit.KN), new Var("γ_m", Unit.ONE)),
          v -> resistance_N(v[0], v[1], v[2]));

  private static final Clause SLACK =
      new Clause("common practice", "-", "no slack guy while the rotor runs", Status.PRACTICE);

  static final Formula LEAST_PULL =
      new Formula(
          "H_min",
          Unit.N,
          "0.1·{H_0}",
          SLACK,
          List.of(new Var("H_0", Unit.N)),
          v -> SLACK_FRACTION * v[0]);

  private GuyChecks() {}

  /** Design resistance of a guy with its ends. */
  public static double resistance_N(double endRatio, double breaking_N, double gammaM) {
    return endRatio * breaking_N / gammaM;
  }

  private record Worst(Response response, GuyForces guy) {}

  /** Strength, hardware and slackness of each level. */
  public static List<Check> of(Design design, List<Response> responses) {
    List<Check> checks = new ArrayList<>();
    for (GuySet set : design.tower().guys()) {
      Optional<Worst> worst =
          worst(
              set,
              responses,
              LimitState.STRENGTH,
              Comparator.comparingDouble(w -> w.guy.greatest_N()));
      worst.ifPresent(
          w -> {
            checks.add(strength(set, w));
            for (GuySet.Hardware piece : set.hardware()) {
              checks.add(hardware(set, piece, w));
            }
          });
      List<Response> running =
          responses.stream()
              .filter(r -> r.mark().limitState() == LimitState.SERVICE && r.mark().running())
              .toList();
      worst(
              set,
              running,
              LimitState.SERVICE,
              Comparator.comparingDouble(w -> -w.guy.horizontal_N() / w.guy.stillAirHorizontal_N()))
          .ifPresent(w -> checks.add(slack(set, w)));
    }
    return checks;
  }

  private static Optional<Worst> worst(
      GuySet set, List<Response> responses, LimitState state, Comparator<Worst> order) {
    return responses.stream()
        .filter(r -> r.mark().limitState() == state)
        .flatMap(r -> r.guys().stream().map(g -> new Worst(r, g)))
        .filter(w -> w.guy.set() == set.number() && !w.guy.removed())
        .max(order);
  }

  private static String place(GuySet set, GuyForces guy) {
    return "level "
        + set.number()
        + ", guy at "
        + Unit.DEG.print(guy.azimuth_rad())
        + ", "
        + set.rope().label();
  }

  private static Check strength(GuySet set, Worst w) {
    Step demand =
        Step.given(
            "F_Ed",
            "greatest tension, at the "
                + (w.guy.tensionAtMast_N() >= w.guy.tensionAtAnchor_N() ? "mast" : "anchor"),
            w.guy.greatest_N(),
            Unit.KN,
            IEC);
    Step capacity =
        RESISTANCE.at(set.ends().efficiencyRatio(), set.rope().breaking_N(), IEC_GAMMA_M);
    Subject subject =
        new Subject(
            "guy-strength",
            "Does the guy with its ends hold?",
            Question.GUYS,
            place(set, w.guy),
            w.response.mark().id());
    return new Check.Limit(subject, IEC, demand, capacity, List.of(demand, capacity), List.of());
  }

  private static Check hardware(GuySet set, GuySet.Hardware piece, Worst w) {
    Subject subject =
        new Subject(
            "guy-hardware",
            "Does the " + piece.what() + " hold?",
            Question.GUYS,
            piece.what() + ", level " + set.number(),
            w.response.mark().id());
    OptionalDouble ultimate = piece.ultimate_N();
    if (ultimate.isEmpty()) {
      return new Check.NotAssessed(
          subject,
          IEC,
          "Neither a breaking load nor a working load with its factor is given; it meets "
              + Unit.KN.print(w.guy.greatest_N())
              + ".",
          List.of(),
          List.of());
    }
    Step demand =
        Step.given("F_Ed", "greatest tension of the level", w.guy.greatest_N(), Unit.KN, IEC);
    Step capacity = RESISTANCE.at(1, ultimate.getAsDouble(), IEC_GAMMA_M);
    return new Check.Limit(subject, IEC, demand, capacity, List.of(demand, capacity), List.of());
  }

  private static Check slack(GuySet set, Worst w) {
    Step required = LEAST_PULL.at(w.guy.stillAirHorizontal_N());
    Step found =
        Step.given(
            "H", "least level pull while the rotor runs", w.guy.horizontal_N(), Unit.N, SLACK);
    Subject subject =
        new Subject(
            "guy-slack",
            "Does every guy stay taut while the rotor runs?",
            Question.GUYS,
            place(set, w.guy),
            w.response.mark().id(),
            "A slack guy snatches, tires its ends and lets the mast sway.");
    return new Check.Separation(
        subject, SLACK, required, found, List.of(required, found), List.of());
  }
}
