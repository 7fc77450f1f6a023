package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.BucklingResult;
import org.mastwright.assess.CaseResult;
import org.mastwright.assess.CombinationSummary;
import org.mastwright.assess.EnvelopePoint;
import org.mastwright.assess.ModeResult;
import org.mastwright.assess.Outline;
import org.mastwright.assess.Reactions;
import org.mastwright.assess.RotorResult;
import org.mastwright.assess.SelfCheck;
import org.mastwright.assess.SpeedResult;
import org.mastwright.assess.Verdict;
import org.mastwright.design.Design;
import org.mastwright.design.GuySet;
import org.mastwright.forces.BaseReaction;
import org.mastwright.forces.CaseMark;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.forces.SectionForces;
import org.mastwright.forces.TopMovement;
import org.mastwright.forces.Vector3;
import org.mastwright.units.Unit;
import org.mastwright.working.Check;
import org.mastwright.working.Clause;
import org.mastwright.working.DefaultTaken;
import org.mastwright.working.Derivation;
import org.mastwright.working.Finding;
import org.mastwright.working.Formula;
import org.mastwright.working.Outcome;
import org.mastwright.working.Question;
import org.mastwright.working.Status;
import org.mastwright.working.Step;
import org.mastwright.working.Subject;

/** Assessments with invented numbers, as rich as those of real towers. */
final class SampleAssessments {
  static final Clause READ = new Clause("EN 1993-1-1", "2005", "6.2.4(2)", Status.READ);
  static final Clause RECALLED = new Clause("IEC 61400-2", "2013", "7.4.9", Status.RECALLED);
  static final Clause PRACTICE = new Clause("common practice", "-", "no source", Status.PRACTICE);

  static final Formula PRESSURE =
      new Formula(
          "q",
          Unit.PA,
          "{ρ}·{V}²/2",
          RECALLED,
          List.of(new Formula.Var("ρ", Unit.KGPM3), new Formula.Var("V", Unit.MPS)),
          v -> v[0] * v[1] * v[1] / 2);
  static final Formula RESISTANCE =
      new Formula(
          "F_Rd",
          Unit.KN,
          "{f_u}·{A}/{γ_M}",
          READ,
          List.of(
              new Formula.Var("f_u", Unit.MPA),
              new Formula.Var("A", Unit.MM2),
              new Formula.Var("γ_M", Unit.ONE)),
          v -> v[0] * v[1] / v[2]);
  static final Formula REDUCTION =
      new Formula(
          "χ",
          Unit.ONE,
          "min(1, 1/({Φ} + √({Φ}² − {λ}²)))",
          READ,
          List.of(new Formula.Var("Φ", Unit.ONE), new Formula.Var("λ", Unit.ONE)),
          v -> Math.min(1, 1 / (v[0] + Math.sqrt(v[0] * v[0] - v[1] * v[1]))));
  static final Formula INTERACTION =
      new Formula(
          "u",
          Unit.ONE,
          "{N_Ed}/({χ}·{N_Rd}) + {k}·{M_Ed}/{M_Rd}",
          READ,
          List.of(
              new Formula.Var("N_Ed", Unit.KN),
              new Formula.Var("χ", Unit.ONE),
              new Formula.Var("N_Rd", Unit.KN),
              new Formula.Var("k", Unit.ONE),
              new Formula.Var("M_Ed", Unit.KNM),
              new Formula.Var("M_Rd", Unit.KNM)),
          v -> v[0] / (v[1] * v[2]) + v[3] * v[4] / v[5]);

  static final Assessment.InputFile INPUT =
      new Assessment.InputFile(
          "bench.yaml", "a41f09c2d5e6b7880102030405060708090a0b0c0d0e0f101112131415161718");

  private SampleAssessments() {}

  static Assessment of(Design design, Verdict verdict) {
    boolean guyed = !design.tower().guys().isEmpty();
    double foot = design.tower().footLevel_m();
    double top = design.tower().topHeight_m();
    double hub = top + 0.457;
    List<Check> checks = checks(guyed, verdict);
    List<CaseResult> cases = cases(design, checks);
    return new Assessment(
        "1.0",
        INPUT,
        design,
        verdict == Verdict.PASS ? List.of() : defaults(),
        verdict == Verdict.PASS ? List.of() : findings(),
        verdict,
        checks,
        derivations(),
        combinations(),
        cases,
        envelope(foot, top),
        reactions(design),
        modes(foot, top),
        List.of(new BucklingResult("I1-225-lo", 3.42)),
        Optional.of(rotor()),
        Optional.of(speeds()),
        selfCheck(),
        new Outline(
            top,
            OptionalDouble.of(hub),
            OptionalDouble.of(hub - 1.83),
            OptionalDouble.of(hub + 1.83),
            OptionalDouble.of(1.87),
            hub + 1.83),
        Optional.of(
            new Derivation(
                "Guy at level 3 towards the west",
                "The same numbers as the program's, worked with a pocket calculator.",
                List.of(PRESSURE.at(1.225, 40), RESISTANCE.at(1210e6, 24.5e-6, 1.1)))));
  }

  private static List<Check> checks(boolean guyed, Verdict verdict) {
    List<Check> checks = new ArrayList<>();
    checks.add(interaction("tube-strength", verdict == Verdict.FAIL ? 1.9 : 0.6));
    checks.add(
        separation("resonance-order-1", Question.ROTOR_SPEED, verdict == Verdict.FAIL ? 0 : 0.2));
    checks.add(separation("blade-guy-clearance", Question.CLEARANCE, 0.3));
    checks.add(limit("tube-shear", Question.TUBE, "along 6.1 m", 3e3));
    if (guyed) {
      checks.add(limit("guy-strength", Question.GUYS, "level 3 west, at the mast", 21e3));
      checks.add(limit("guy-service", Question.GUYS, "level 2 north", 12e3));
      checks.add(
          limit(
              "anchor-pull",
              Question.ANCHORS,
              "west, tested",
              verdict == Verdict.FAIL ? 37e3 : 25e3));
    }
    if (verdict != Verdict.PASS) {
      checks.add(
          new Check.NotAssessed(
              new Subject("footing", "Will the footing hold?", Question.FOOTING, "pad", "-"),
              PRACTICE,
              "The ground under the footing is not described.",
              List.of(),
              List.of()));
    }
    return checks;
  }

  private static Check limit(String id, Question question, String where, double demand_N) {
    Step capacity = RESISTANCE.at(1210e6, 24.5e-6, 1.1);
    Step demand = Step.given("F_Ed", "from the analysis", demand_N, Unit.KN, RECALLED);
    return new Check.Limit(
        new Subject(
            id,
            "Does it hold the greatest pull (" + id + ")?",
            question,
            where,
            "I1-225-lo",
            "A clip that is put on the wrong way round holds half."),
        READ,
        demand,
        capacity,
        List.of(capacity),
        List.of(
            Finding.of(
                "end-efficiency",
                Finding.Severity.ASSUMPTION,
                "The efficiency of the ends was not given; 0.80 was taken.",
                "Give ends.efficiency.")));
  }

  private static Check interaction(String id, double moment_kNm) {
    Step chi = REDUCTION.at(1.2, 0.9);
    Step sum = INTERACTION.at(12e3, chi.si(), 400e3, 1.0, moment_kNm * 1000, 2e3);
    return new Check.Interaction(
        new Subject(
            id,
            "Does the pipe hold push and bending together?",
            Question.TUBE,
            "at guy level 2, 11.8 m",
            "I1-225-lo"),
        READ,
        sum,
        List.of(chi, sum),
        List.of());
  }

  private static Check separation(String id, Question question, double distance) {
    Step required = Step.given("Δ_req", "a tenth of the frequency", 0.13, Unit.HZ, PRACTICE);
    Step there = Step.given("Δ", "the nearest they come", distance, Unit.HZ, RECALLED);
    return new Check.Separation(
        new Subject(
            id,
            "Is the distance kept (" + id + ")?",
            question,
            "mode 1, 130 rpm",
            "still-air",
            "What dwells in step with a swing builds it up."),
        RECALLED,
        required,
        there,
        List.of(),
        List.of());
  }

  private static List<DefaultTaken> defaults() {
    return List.of(
        new DefaultTaken("tower.damping", "0.2 %", "practice", DefaultTaken.Side.SAFE),
        new DefaultTaken(
            "site.temperature.setting",
            "10 degC",
            "EN 1991-1-5 [recalled]",
            DefaultTaken.Side.NEUTRAL),
        new DefaultTaken("turbine.rotor.mass", "21 kg", "mass rule", DefaultTaken.Side.UNKNOWN));
  }

  private static List<Finding> findings() {
    return List.of(
        new Finding(
            "ice-not-stated",
            Finding.Severity.OPEN_POINT,
            "site.ice",
            0,
            0,
            "Nobody said whether ice forms here: worked out without ice.",
            "Give site.ice."),
        new Finding(
            "soil-not-described",
            Finding.Severity.OPEN_POINT,
            "site.soil",
            0,
            0,
            "The ground is not described, so that the footing was not assessed.",
            ""),
        new Finding(
            "E14",
            Finding.Severity.WARNING,
            "tower.guys[0].tension",
            71,
            12,
            "Snug is a feeling and not a tension.",
            "Count ten returns of a pulse."),
        Finding.at(
            "k-rope",
            Finding.Severity.ASSUMPTION,
            "tower.guys",
            "The modulus of the strand was taken from its kind, ±15 %.",
            ""),
        Finding.of(
            "not-yet-used", Finding.Severity.NOTE, "Read, not yet used: raising.props.", ""));
  }

  private static List<Derivation> derivations() {
    return List.of(
        new Derivation(
            "Pressure of the extreme wind",
            "At hub height, 3 s gust.",
            List.of(Step.given("V", "stated", 40, Unit.MPS, PRACTICE), PRESSURE.at(1.18, 40))),
        new Derivation("Pressure in operation", "", List.of(PRESSURE.at(1.18, 12.7))));
  }

  private static List<CombinationSummary> combinations() {
    List<CombinationSummary.FactorUsed> factors =
        List.of(
            new CombinationSummary.FactorUsed("wind", 3.0, RECALLED),
            new CombinationSummary.FactorUsed("weight", 1.35, PRACTICE));
    return List.of(
        new CombinationSummary(
            "I1",
            "Storm, machine stopped or spinning",
            "The greatest wind of fifty years",
            "1.35 G + P lo/hi + 3.0 W",
            LimitState.STRENGTH,
            RECALLED,
            factors,
            96),
        new CombinationSummary(
            "I2",
            "Operation at the greatest thrust",
            "1.35 G + P + 3.0 T",
            "The rotor pushes hardest while it runs",
            LimitState.STRENGTH,
            RECALLED,
            factors,
            48),
        new CombinationSummary(
            "I11",
            "Everyday extremes",
            "G + P + W",
            "Lean and clearances",
            LimitState.SERVICE,
            RECALLED,
            List.of(),
            24));
  }

  private static List<CaseResult> cases(Design design, List<Check> checks) {
    List<CaseResult> cases = new ArrayList<>();
    for (int i = 0; i < 4; i++) {
      boolean governs = i == 1;
      List<String> ids =
          governs
              ? checks.stream()
                  .filter(c -> c.outcome() != Outcome.NOT_ASSESSED)
                  .map(c -> c.subject().id())
                  .toList()
              : List.of();
      cases.add(new CaseResult(response(design, i, governs), ids));
    }
    return cases;
  }

  private static Response response(Design design, int number, boolean limit) {
    String id = limit ? "I1-225-lo" : "I1-" + (180 + 15 * number) + "-hi";
    CaseMark mark =
        new CaseMark(
            id,
            "I1",
            "storm from " + (180 + 15 * number) + ", stopped, loose guys",
            "IEC 61400-2 simplified",
            LimitState.STRENGTH,
            3.9,
            4100 + number,
            false);
    List<GuyForces> guys = new ArrayList<>();
    for (GuySet set : design.tower().guys()) {
      for (int i = 0; i < set.guys().size(); i++) {
        double pull = 4000 + 900 * i + 100 * number;
        guys.add(
            new GuyForces(
                set.number(),
                i,
                set.guys().get(i).azimuth_rad(),
                i,
                pull,
                pull * 0.98,
                new Vector3(-pull * 0.5, 0, pull * 0.8),
                600,
                false,
                false,
                List.of()));
      }
    }
    return new Response(
        mark,
        List.of(new SectionForces(0, 0.2, -18e3, 900, 300, 100, 60, 10, 0, 0)),
        guys,
        new BaseReaction(-900, -300, 18e3, 0, 0, 40),
        new TopMovement(0.11, 0.09, -0.002, 0.02, 0.7, 0.001),
        2e-10,
        7,
        true,
        1.0,
        limit
            ? Optional.of(new Response.LimitPoint(1.62, OptionalDouble.of(1.64)))
            : Optional.empty());
  }

  private static List<EnvelopePoint> envelope(double foot, double top) {
    return IntStream.rangeClosed(0, 48)
        .mapToObj(
            i -> {
              double s = i / 48.0;
              return new EnvelopePoint(
                  foot + s * (top - foot),
                  19e3 - 15e3 * s,
                  600 + 1800 * Math.abs(Math.sin(9 * s)),
                  2100 * Math.abs(Math.sin(7 * s)),
                  80 * s,
                  0.16 * s * s);
            })
        .toList();
  }

  private static Reactions reactions(Design design) {
    BaseReaction factored = new BaseReaction(-2100, 880, 24_300, 0, 310, 44);
    BaseReaction plain = new BaseReaction(-700, 290, 11_200, 0, 110, 15);
    List<Reactions.AnchorPull> pulls =
        design.ground().anchors().stream()
            .map(
                x ->
                    new Reactions.AnchorPull(
                        x.name(),
                        IntStream.rangeClosed(1, 3)
                            .mapToObj(s -> new Reactions.GuyEnd(s, x.bearing_rad()))
                            .toList(),
                        new Vector3(-x.east_m() * 1300, -x.north_m() * 1300, 16_000),
                        "I1-225-lo",
                        new Vector3(-x.east_m() * 450, -x.north_m() * 450, 5600),
                        "I1k-225-lo"))
            .toList();
    return new Reactions(
        List.of(
            new Reactions.FootReaction("greatest push down", "I1-225-lo", factored, plain),
            new Reactions.FootReaction("greatest shear", "I1-195-hi", factored, plain)),
        pulls);
  }

  private static List<ModeResult> modes(double foot, double top) {
    return IntStream.rangeClosed(1, 6)
        .mapToObj(
            n ->
                new ModeResult(
                    "still-air",
                    n,
                    0.9 + 0.8 * n,
                    n % 2 == 0 ? "north" : "east",
                    (n + 1) / 2 + ". bending",
                    1.0 / n,
                    IntStream.rangeClosed(0, 30)
                        .mapToObj(
                            i -> {
                              double s = i / 30.0;
                              double v = Math.sin(s * 1.57 * ((n + 1) / 2));
                              return new ModeResult.ShapePoint(
                                  foot + s * (top - foot),
                                  n % 2 == 0 ? 0 : v,
                                  n % 2 == 0 ? v : 0,
                                  0.2 * s);
                            })
                        .toList()))
        .toList();
  }

  private static RotorResult rotor() {
    return new RotorResult(
        "actuator disc with high induction",
        List.of(new RotorResult.CurvePoint(7, 0, 0.38, 0.75)),
        IntStream.rangeClosed(3, 18)
            .mapToObj(
                v ->
                    new RotorResult.OperationPoint(
                        v,
                        3.5 * v,
                        Math.min(1900, 1.5 * v * v * v),
                        Math.min(620, 5.2 * v * v),
                        0.8,
                        v < 12 ? "running" : "furled"))
            .toList(),
        List.of(
            new RotorResult.StateRow("running at rated", 10.7, 40.8, 590, false, "CT 0.8"),
            new RotorResult.StateRow("runaway", 18, 81, 1390, true, "CT 0.8 at furl failed"),
            new RotorResult.StateRow("stopped", 40, 0, 960, false, "blade area, Cd 1.5")),
        List.of(PRESSURE.at(1.18, 10.7)));
  }

  private static SpeedResult speeds() {
    return new SpeedResult(
        List.of(1, 3),
        Unit.RPM.toSi(130),
        Unit.RPM.toSi(420),
        List.of(
            new SpeedResult.Window(
                Unit.RPM.toSi(171), Unit.RPM.toSi(208), 3.1, 3.4, "second sway, once per turn")),
        List.of(
            new SpeedResult.Range(Unit.RPM.toSi(130), Unit.RPM.toSi(171)),
            new SpeedResult.Range(Unit.RPM.toSi(208), Unit.RPM.toSi(420))),
        List.of(
            new SpeedResult.FrequencyBand(1, "first sway", 1.6, 1.75, true),
            new SpeedResult.FrequencyBand(2, "second sway", 3.1, 3.4, true),
            new SpeedResult.FrequencyBand(3, "third sway", 8.8, 9.3, false)),
        List.of("Starting and stopping: go through 171 to 208 rpm without dwelling there."));
  }

  private static SelfCheck selfCheck() {
    return new SelfCheck(
        3.1e-10,
        2.2e-10,
        true,
        0.0004,
        List.of(
            new SelfCheck.Row("base moment", "finite elements", 310.2, "statics", 310.3, "N·m"),
            new SelfCheck.Row(
                "first frequency", "iteration", 1.702, "Rayleigh quotient", 1.709, "Hz")));
  }
}
