package org.mastwright.assess;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.mastwright.checks.anchor.AnchorChecks;
import org.mastwright.checks.clearance.ClearanceChecks;
import org.mastwright.checks.guy.GuyChecks;
import org.mastwright.checks.joint.JointChecks;
import org.mastwright.checks.member.TubeChecks;
import org.mastwright.design.Design;
import org.mastwright.forces.Response;
import org.mastwright.loads.Combination;
import org.mastwright.loads.LoadCase;
import org.mastwright.loads.LoadModel;
import org.mastwright.mast.MastModel;
import org.mastwright.mast.ModeFinder;
import org.mastwright.mast.VerificationRun;
import org.mastwright.units.Unit;
import org.mastwright.working.Check;
import org.mastwright.working.DefaultTaken;
import org.mastwright.working.Derivation;
import org.mastwright.working.Finding;

/** The one pipeline: loads, responses, checks, frequencies, self-check, verdict. */
public final class Assessor {
  /** Of the program; the same in every output. */
  public static final String VERSION = "1.0";

  private static final double SOUND_RATIO = 1e-3;

  /** The second method takes the bent axis as straight between nodes. */
  private static final double SECOND_METHOD_RATIO = 0.02;

  private Assessor() {}

  /**
   * Assesses a design with site and turbine, or solves its verification cases.
   *
   * @throws org.mastwright.working.AnalysisException when there is no equilibrium in still air
   */
  public static Assessment assess(
      Design design,
      Assessment.InputFile input,
      List<DefaultTaken> defaults,
      List<Finding> findings,
      Progress progress) {
    return design.verification().isPresent()
        ? verification(design, input, defaults, findings)
        : whole(design, input, defaults, findings, progress);
  }

  private static Assessment whole(
      Design design,
      Assessment.InputFile input,
      List<DefaultTaken> defaults,
      List<Finding> read,
      Progress progress) {
    progress.stage("setting the guys", 0, 1);
    MastModel model = MastModel.of(design);
    LoadModel loads = LoadModel.of(design);
    List<SolvedCase> cases =
        new CaseRunner(solver(model), progress).run(loads.combinations(), loads.directions_rad());
    List<Response> responses = cases.stream().map(SolvedCase::response).toList();
    progress.stage("frequencies", 0, 1);
    Speeds speeds = Speeds.of(design, new ModeFinder(model), loads.running());
    Outline outline = Outlines.of(design);
    List<Check> checks = new ArrayList<>();
    checks.addAll(TubeChecks.of(design, responses));
    checks.addAll(GuyChecks.of(design, responses));
    checks.addAll(AnchorChecks.of(design, responses));
    checks.addAll(JointChecks.of(design, responses));
    checks.addAll(speeds.checks());
    checks.addAll(
        ClearanceChecks.of(
            design,
            responses,
            outline.highestBlade_m().orElse(outline.mastTop_m()),
            outline.lowestBlade_m().orElse(0)));
    checks = new ArrayList<>(Unproved.of(checks, responses));
    checks.sort(Comparator.comparing(c -> c.subject().question()));
    SelfCheck self = SelfChecks.of(design, cases, speeds);
    List<Finding> findings = new ArrayList<>(read);
    findings.addAll(loads.findings());
    findings.addAll(speeds.findings());
    checks.forEach(c -> findings.addAll(c.findings()));
    if (!(self.equilibriumRatio() <= SOUND_RATIO)
        || !(self.secondMethodRatio() <= SECOND_METHOD_RATIO)
        || !self.modeCount()) {
      findings.add(
          Finding.of(
              "self-check",
              Finding.Severity.OPEN_POINT,
              "The calculation does not balance as it should; see the self-check.",
              "Do not use these numbers; report the file."));
    }
    return new Assessment(
        VERSION,
        input,
        design,
        defaults,
        findings,
        Verdicts.of(checks, findings),
        checks,
        loads.derivations(),
        summaries(loads.combinations(), cases),
        results(cases, checks),
        Envelopes.of(cases),
        ReactionTables.of(design, responses),
        speeds.modes(),
        buckling(model, cases, checks),
        Optional.of(rotor(loads)),
        Optional.of(speeds.result()),
        self,
        outline,
        HandChecks.of(design, cases, checks));
  }

  /**
   * Only the rotor speeds to keep off: no load case is solved, nothing else is judged.
   *
   * @throws org.mastwright.working.AnalysisException when there is no equilibrium in still air
   */
  public static Assessment speeds(
      Design design,
      Assessment.InputFile input,
      List<DefaultTaken> defaults,
      List<Finding> read,
      Progress progress) {
    progress.stage("setting the guys", 0, 1);
    MastModel model = MastModel.of(design);
    progress.stage("frequencies", 0, 1);
    Speeds speeds = Speeds.of(design, new ModeFinder(model), LoadModel.of(design).running());
    progress.stage("frequencies", 1, 1);
    List<Finding> findings = new ArrayList<>(read);
    findings.addAll(speeds.findings());
    findings.add(
        Finding.of(
            "speeds-only",
            Finding.Severity.OPEN_POINT,
            "Only rotor speeds were looked at: not strength, wind, soil or raising.",
            "Run `mastwright check` before anything is built."));
    return new Assessment(
        VERSION,
        input,
        design,
        defaults,
        findings,
        Verdicts.of(speeds.checks(), findings),
        speeds.checks(),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        new Reactions(List.of(), List.of()),
        speeds.modes(),
        List.of(),
        Optional.empty(),
        Optional.of(speeds.result()),
        SelfChecks.of(design, List.of(), speeds),
        Outlines.of(design),
        Optional.empty());
  }

  private static CaseRunner.Solver solver(MastModel model) {
    return new CaseRunner.Solver() {
      @Override
      public Response solve(LoadCase loads) {
        return model.solve(loads);
      }

      @Override
      public Response solveWithLimit(LoadCase loads, double capFactor) {
        return model.solveWithLimit(loads, capFactor);
      }
    };
  }

  private static List<CombinationSummary> summaries(
      List<Combination> combinations, List<SolvedCase> cases) {
    List<CombinationSummary> all = new ArrayList<>();
    for (Combination c : combinations) {
      int run =
          (int)
              cases.stream()
                  .filter(s -> s.response().mark().combination().equals(c.code()))
                  .count();
      all.add(
          new CombinationSummary(
              c.code(),
              c.title(),
              c.composition(),
              c.purpose(),
              c.limitState(),
              c.clause(),
              c.factors().stream()
                  .map(
                      f -> new CombinationSummary.FactorUsed(f.name(), f.valueFactor(), f.clause()))
                  .toList(),
              run));
    }
    return all;
  }

  private static List<CaseResult> results(List<SolvedCase> cases, List<Check> checks) {
    Map<String, List<String>> governs = new LinkedHashMap<>();
    for (Check c : checks) {
      List<String> ids = governs.computeIfAbsent(c.subject().caseId(), k -> new ArrayList<>());
      if (!ids.contains(c.subject().id())) {
        ids.add(c.subject().id());
      }
    }
    return cases.stream()
        .map(
            s ->
                new CaseResult(
                    s.response(), governs.getOrDefault(s.response().mark().id(), List.of())))
        .toList();
  }

  /** Of the cases that govern a tube or the stability. */
  private static List<BucklingResult> buckling(
      MastModel model, List<SolvedCase> cases, List<Check> checks) {
    List<String> ids =
        checks.stream()
            .filter(c -> c.subject().id().equals("stability-limit"))
            .map(c -> c.subject().caseId())
            .toList();
    return cases.stream()
        .filter(s -> ids.contains(s.response().mark().id()))
        .map(s -> new BucklingResult(s.response().mark().id(), model.bucklingFactor(s.loads())))
        .toList();
  }

  private static RotorResult rotor(LoadModel loads) {
    double most = loads.rotor().states().stream().mapToDouble(s -> s.thrust_N()).max().orElse(0);
    return new RotorResult(
        "momentum",
        List.of(),
        loads.rotor().operation().stream()
            .map(
                s ->
                    new RotorResult.OperationPoint(
                        s.wind_mps(), s.omega_radps(), s.power_W(), s.thrust_N(), s.ct(), s.name()))
            .toList(),
        loads.rotor().states().stream()
            .map(
                s ->
                    new RotorResult.StateRow(
                        s.name(),
                        s.wind_mps(),
                        s.omega_radps(),
                        s.thrust_N(),
                        s.thrust_N() == most,
                        s.how()))
            .toList(),
        loads.rotor().steps());
  }

  private static Assessment verification(
      Design design,
      Assessment.InputFile input,
      List<DefaultTaken> defaults,
      List<Finding> findings) {
    VerificationRun run = VerificationRun.run(design);
    List<ModeResult> modes = new ArrayList<>();
    boolean complete = true;
    for (ModeFinder.State s : run.modes()) {
      modes.addAll(Speeds.results(s, run.heights_m()));
      complete &= s.complete();
    }
    List<BucklingResult> buckling = new ArrayList<>();
    for (int i = 0; i < run.responses().size(); i++) {
      buckling.add(
          new BucklingResult(run.responses().get(i).mark().id(), run.bucklingFactor().get(i)));
    }
    double residual = run.responses().stream().mapToDouble(Response::residual).max().orElse(0);
    return new Assessment(
        VERSION,
        input,
        design,
        defaults,
        findings,
        Verdict.VERIFICATION,
        List.of(),
        List.<Derivation>of(),
        List.of(),
        run.responses().stream().map(r -> new CaseResult(r, List.of())).toList(),
        List.of(),
        new Reactions(List.of(), List.of()),
        modes,
        buckling,
        Optional.empty(),
        Optional.empty(),
        new SelfCheck(residual, residual, complete, 0, List.of()),
        Outlines.of(design),
        Optional.empty());
  }

  /** A number in its unit, for words. */
  static String print(double si, Unit unit) {
    return unit.print(si);
  }
}
