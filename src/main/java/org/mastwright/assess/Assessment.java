package org.mastwright.assess;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.mastwright.design.Design;
import org.mastwright.working.Check;
import org.mastwright.working.DefaultTaken;
import org.mastwright.working.Derivation;
import org.mastwright.working.Finding;
import org.mastwright.working.Outcome;

/**
 * Everything the program found out about one tower. Paper, screen and results.json print from here
 * and calculate nothing.
 *
 * @param version of the program
 * @param input the file it was read from
 * @param defaults values that were not given
 * @param findings warnings, assumptions, open points, keys read but not yet used
 * @param checks one per id and place, the worst of all cases, in the order of the report
 * @param derivations how the loads came about, step by step
 * @param combinations the load combinations with their factors
 * @param cases every case solved, in order of combination, direction, variant
 * @param envelope greatest forces along the mast over all strength cases
 * @param reactions at the foot and at every anchor
 * @param outline heights and distances that the first page and the drawings name
 * @param handCheck one check worked by hand from start to end
 */
public record Assessment(
    String version,
    InputFile input,
    Design design,
    List<DefaultTaken> defaults,
    List<Finding> findings,
    Verdict verdict,
    List<Check> checks,
    List<Derivation> derivations,
    List<CombinationSummary> combinations,
    List<CaseResult> cases,
    List<EnvelopePoint> envelope,
    Reactions reactions,
    List<ModeResult> modes,
    List<BucklingResult> buckling,
    Optional<RotorResult> rotor,
    Optional<SpeedResult> speeds,
    SelfCheck selfCheck,
    Outline outline,
    Optional<Derivation> handCheck) {
  public Assessment {
    defaults = List.copyOf(defaults);
    findings = List.copyOf(findings);
    checks = List.copyOf(checks);
    derivations = List.copyOf(derivations);
    combinations = List.copyOf(combinations);
    cases = List.copyOf(cases);
    envelope = List.copyOf(envelope);
    modes = List.copyOf(modes);
    buckling = List.copyOf(buckling);
  }

  /** The file and the mark of its bytes. */
  public record InputFile(String name, String sha256) {}

  /**
   * The check that decides: among those that fail, or else among those that pass, the one with the
   * greatest utilisation. One without a number decides only where no other fails.
   */
  public Optional<Check> governing() {
    return checks.stream()
        .filter(c -> c.outcome() != Outcome.NOT_ASSESSED)
        .max(
            Comparator.comparing((Check c) -> c.outcome() == Outcome.FAIL)
                .thenComparingDouble(c -> c.utilisation().orElse(0)));
  }

  /** Findings of one severity. */
  public List<Finding> findings(Finding.Severity severity) {
    return findings.stream().filter(f -> f.severity() == severity).toList();
  }

  /** The exit code of a run that ends with this verdict. */
  public int exitCode() {
    return switch (verdict) {
      case PASS, VERIFICATION -> 0;
      case FAIL -> 1;
      case INCOMPLETE -> 2;
    };
  }
}
