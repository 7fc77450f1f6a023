package org.mastwright.resonance;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.mastwright.design.Turbine.Band;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;
import org.mastwright.working.Check;
import org.mastwright.working.Clause;
import org.mastwright.working.Finding;
import org.mastwright.working.Formula;
import org.mastwright.working.Question;
import org.mastwright.working.Status;
import org.mastwright.working.Step;
import org.mastwright.working.Subject;

/**
 * The distance of every natural frequency that moves the hub from each excitation of the rotor,
 * over all speeds it dwells at.
 */
public final class SeparationChecks {
  /** IEC 61400-2 asks for a resonance check and gives no number. */
  static final Clause ASKED =
      new Clause("IEC 61400-2", "2013", "resonance of the support structure", Status.RECALLED);

  /** ±10 %: guidelines for the design of wind turbines and later practice. */
  static final Clause MARGIN =
      new Clause(
          "Guidelines for Design of Wind Turbines",
          "2002",
          "first frequency outside ±10 % of 1P and blade passing",
          Status.RECALLED);

  static final Formula ROTOR_FREQUENCY =
      new Formula(
          "f_R",
          Unit.HZ,
          "{Ω}/(2·π)",
          new Clause("definition", "-", "turns per second", Status.PRACTICE),
          List.of(new Formula.Var("Ω", Unit.RADPS)),
          v -> turns_Hz(v[0]));

  static final Formula DISTANCE =
      new Formula(
          "Δf",
          Unit.HZ,
          "|{f} − {k}·{f_R}|",
          ASKED,
          List.of(
              new Formula.Var("f", Unit.HZ),
              new Formula.Var("k", Unit.ONE),
              new Formula.Var("f_R", Unit.HZ)),
          v -> distance_Hz(v[0], v[1], v[2]));

  static final Formula REQUIRED =
      new Formula(
          "Δf_req",
          Unit.HZ,
          "{m}·{f}",
          MARGIN,
          List.of(new Formula.Var("m", Unit.PERCENT), new Formula.Var("f", Unit.HZ)),
          v -> required_Hz(v[0], v[1]));

  private SeparationChecks() {}

  /** Rotor frequency {@code f_R = Ω / 2π}. */
  static double turns_Hz(double omega_radps) {
    return omega_radps / (2 * Math.PI);
  }

  /** Distance of a natural frequency from the {@code order}-th multiple of the rotor frequency. */
  static double distance_Hz(double natural_Hz, double orderCoefficient, double rotor_Hz) {
    return Math.abs(natural_Hz - orderCoefficient * rotor_Hz);
  }

  /** Distance to be kept: a share of the natural frequency. */
  static double required_Hz(double marginRatio, double natural_Hz) {
    return marginRatio * natural_Hz;
  }

  /**
   * One check per judged excitation: the mode that comes nearest to it at any speed the rotor
   * dwells at.
   *
   * @param dwelling ranges of rotor speed it stays in: the speed range less the bands it skips
   */
  public static List<Check> of(
      List<ModeBand> modes,
      List<Excitation> excitations,
      List<Band> dwelling,
      double marginRatio,
      boolean uprightRotor,
      List<Finding> findings) {
    List<Check> checks = new ArrayList<>();
    for (Excitation excitation : excitations) {
      if (excitation.judged()) {
        modes.stream()
            .filter(m -> m.blocks(uprightRotor))
            .map(m -> nearest(m, excitation, dwelling))
            .flatMap(Optional::stream)
            .min(Comparator.comparingDouble(Nearest::share))
            .ifPresent(n -> checks.add(check(n, excitation, marginRatio, findings)));
      }
    }
    return checks;
  }

  /** A mode's edge and the rotor speed nearest to it; the gap is zero inside the band. */
  private record Nearest(ModeBand mode, double frequency_Hz, double omega_radps, double gap_Hz) {
    /** What decides: the gap as a share of the frequency, since the margin is one too. */
    double share() {
      return gap_Hz / frequency_Hz;
    }
  }

  private static Optional<Nearest> nearest(
      ModeBand mode, Excitation excitation, List<Band> dwelling) {
    Nearest best = null;
    for (Band band : dwelling) {
      double from_Hz = excitation.order() * turns_Hz(band.from_radps());
      double to_Hz = excitation.order() * turns_Hz(band.to_radps());
      Nearest here;
      if (from_Hz > mode.greatest_Hz()) {
        here =
            new Nearest(mode, mode.greatest_Hz(), band.from_radps(), from_Hz - mode.greatest_Hz());
      } else if (to_Hz < mode.least_Hz()) {
        here = new Nearest(mode, mode.least_Hz(), band.to_radps(), mode.least_Hz() - to_Hz);
      } else {
        double met_Hz = Math.max(from_Hz, mode.least_Hz());
        here = new Nearest(mode, met_Hz, 2 * Math.PI * met_Hz / excitation.order(), 0);
      }
      if (best == null || here.share() < best.share()) {
        best = here;
      }
    }
    return Optional.ofNullable(best);
  }

  private static Check check(
      Nearest n, Excitation excitation, double marginRatio, List<Finding> findings) {
    Step rotor = ROTOR_FREQUENCY.at(n.omega_radps);
    Step required = REQUIRED.at(marginRatio, n.frequency_Hz);
    Step distance =
        n.gap_Hz > 0
            ? DISTANCE.at(n.frequency_Hz, excitation.order(), rotor.si())
            : Step.given(
                "Δf",
                "the excitation meets the frequency within the speed range",
                0,
                Unit.HZ,
                ASKED);
    String where =
        excitation.name()
            + ", "
            + Unit.RPM.print(n.omega_radps)
            + ", mode "
            + n.mode.number()
            + " ("
            + n.mode.description()
            + ", "
            + Numbers.significant(n.mode.least_Hz(), 3)
            + "–"
            + Unit.HZ.print(n.mode.greatest_Hz())
            + ")";
    Subject subject =
        new Subject(
            "resonance-order-" + excitation.order(),
            "Does the rotor shake the tower " + excitation.name() + "?",
            Question.ROTOR_SPEED,
            where,
            "still-air",
            "A rotor that dwells where its excitation meets a natural frequency shakes the tower"
                + " until something tires; damping of 0.2 % multiplies the movement some 200 times.");
    return new Check.Separation(
        subject, ASKED, required, distance, List.of(rotor, required, distance), findings);
  }
}
