package org.mastwright.checks.member;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.design.Section;
import org.mastwright.design.Tube;
import org.mastwright.forces.SectionForces;
import org.mastwright.units.Unit;
import org.mastwright.working.Check;
import org.mastwright.working.Clause;
import org.mastwright.working.Finding;
import org.mastwright.working.Formula;
import org.mastwright.working.Formula.Var;
import org.mastwright.working.Status;
import org.mastwright.working.Step;
import org.mastwright.working.Subject;

/**
 * Tubes by EN 1993-1-1:2005: section class, bending with axial force, shear with torsion. The
 * partial factor on the yield strength is a parameter: 1.1 with the loads of IEC 61400-2.
 */
public final class EnTube {
  private static final String EN = "EN 1993-1-1";

  private static Clause en(String number, Status status) {
    return new Clause(EN, "2005", number, status);
  }

  static final Formula EPSILON =
      new Formula(
          "ε",
          Unit.ONE,
          "√(235000000/{f_y})",
          en("Table 5.2", Status.READ),
          List.of(new Var("f_y", Unit.PA)),
          v -> epsilon(v[0]));

  static final Formula AXIAL =
      new Formula(
          "N_Rd",
          Unit.KN,
          "{A}·{f_y}/{γ_M}",
          en("6.2.4(2)", Status.RECALLED),
          List.of(new Var("A", Unit.MM2), new Var("f_y", Unit.MPA), new Var("γ_M", Unit.ONE)),
          v -> v[0] * v[1] / v[2]);

  static final Formula BENDING =
      new Formula(
          "M_Rd",
          Unit.KNM,
          "{W}·{f_y}/{γ_M}",
          en("6.2.5(2)", Status.RECALLED),
          List.of(new Var("W", Unit.CM3), new Var("f_y", Unit.MPA), new Var("γ_M", Unit.ONE)),
          v -> v[0] * v[1] / v[2]);

  static final Formula PLASTIC_SUM =
      new Formula(
          "u",
          Unit.ONE,
          "{M}/({M_Rd}·cos(π·{N}/(2·{N_Rd})))",
          en("6.2.9.1(5), exact for a thin round tube", Status.RECALLED),
          List.of(
              new Var("M", Unit.KNM),
              new Var("M_Rd", Unit.KNM),
              new Var("N", Unit.KN),
              new Var("N_Rd", Unit.KN)),
          v -> v[0] / (v[1] * Math.cos(Math.PI * v[2] / (2 * v[3]))));

  static final Formula SQUASHED =
      new Formula(
          "u",
          Unit.ONE,
          "{N}/{N_Rd}",
          en("6.2.4(1), the axial force alone is too much", Status.RECALLED),
          List.of(new Var("N", Unit.KN), new Var("N_Rd", Unit.KN)),
          v -> v[0] / v[1]);

  static final Formula ELASTIC_SUM =
      new Formula(
          "u",
          Unit.ONE,
          "{M}/{M_Rd} + {N}/{N_Rd}",
          en("6.2.9.2", Status.RECALLED),
          List.of(
              new Var("M", Unit.KNM),
              new Var("M_Rd", Unit.KNM),
              new Var("N", Unit.KN),
              new Var("N_Rd", Unit.KN)),
          v -> v[0] / v[1] + v[2] / v[3]);

  static final Formula SHEAR =
      new Formula(
          "V_Rd",
          Unit.KN,
          "2·{A}/π·{f_y}/(√(3)·{γ_M})",
          en("6.2.6(2)(3)", Status.RECALLED),
          List.of(new Var("A", Unit.MM2), new Var("f_y", Unit.MPA), new Var("γ_M", Unit.ONE)),
          v -> shear_N(v[0], v[1], v[2]));

  static final Formula TORSION =
      new Formula(
          "T_Rd",
          Unit.KNM,
          "2·{W}·{f_y}/(√(3)·{γ_M})",
          en("6.2.7, elastic, W_T = 2 W", Status.RECALLED),
          List.of(new Var("W", Unit.CM3), new Var("f_y", Unit.MPA), new Var("γ_M", Unit.ONE)),
          v -> 2 * v[0] * v[1] / (Math.sqrt(3) * v[2]));

  static final Formula SHEAR_SUM =
      new Formula(
          "u",
          Unit.ONE,
          "{V}/{V_Rd} + {T}/{T_Rd}",
          en("6.2.7(9), linear", Status.RECALLED),
          List.of(
              new Var("V", Unit.KN),
              new Var("V_Rd", Unit.KN),
              new Var("T", Unit.KNM),
              new Var("T_Rd", Unit.KNM)),
          v -> v[0] / v[1] + v[2] / v[3]);

  private EnTube() {}

  static double epsilon(double yield_Pa) {
    return Math.sqrt(235e6 / yield_Pa);
  }

  /** Class 1 to 4 by d/t against 50, 70, 90 ε² (Table 5.2 sheet 3). */
  public static int sectionClass(Section s, double yield_Pa) {
    double square = epsilon(yield_Pa) * epsilon(yield_Pa);
    if (!s.isRound()) {
      double flat = s.outside_m() * Math.tan(Math.PI / s.sides());
      return flat / s.wall_m() <= 42 * epsilon(yield_Pa) ? 3 : 4;
    }
    double ratio = s.outside_m() / s.wall_m();
    return ratio <= 50 * square ? 1 : ratio <= 70 * square ? 2 : ratio <= 90 * square ? 3 : 4;
  }

  /** {@code A_v = 2A/π}. */
  static double shear_N(double area_m2, double yield_Pa, double gammaM) {
    return 2 * area_m2 / Math.PI * yield_Pa / (Math.sqrt(3) * gammaM);
  }

  /**
   * Bending over what the axial force leaves of it, {@code cos(πn/2)}; infinite when the axial
   * force alone is too much.
   */
  public static double plasticSum(
      double moment_Nm, double bending_Nm, double axial_N, double squash_N) {
    double n = axial_N / squash_N;
    if (n >= 1) {
      return Double.MAX_VALUE;
    }
    return moment_Nm / (bending_Nm * Math.cos(Math.PI * n / 2));
  }

  /** Reduction factor of flexural buckling (6.3.1.2), curve by its imperfection factor. */
  public static double chi(double slenderness, double imperfectionFactor) {
    if (slenderness <= 0.2) {
      return 1;
    }
    double phi = 0.5 * (1 + imperfectionFactor * (slenderness - 0.2) + slenderness * slenderness);
    return Math.min(1, 1 / (phi + Math.sqrt(phi * phi - slenderness * slenderness)));
  }

  /** The greatest of what the section is used to: for the search, without steps. */
  static double utilisation(Tube tube, SectionForces f, double gammaM) {
    Section s = tube.sectionAt(f.along_m());
    double fy = tube.steel().yield_Pa();
    int kind = sectionClass(s, fy);
    double n = Math.max(0, Math.abs(f.axial_N()));
    double squash = s.area_m2() * fy / gammaM;
    double w = kind <= 2 ? s.plasticModulus_m3() : s.elasticModulus_m3();
    double bending = w * fy / gammaM;
    return kind <= 2
        ? plasticSum(f.moment_Nm(), bending, n, squash)
        : f.moment_Nm() / bending + n / squash;
  }

  /** Bending with axial force. */
  static Check strength(
      Tube tube, SectionForces f, double gammaM, Subject subject, List<Finding> findings) {
    Section s = tube.sectionAt(f.along_m());
    double fy = tube.steel().yield_Pa();
    int kind = sectionClass(s, fy);
    Clause clause = en("6.2.9", Status.RECALLED);
    List<Step> steps = new ArrayList<>();
    steps.add(EPSILON.at(fy));
    steps.add(
        Step.given(
            "class",
            s.isRound() ? "d/t against 50, 70, 90 ε²" : "flat/t against 42 ε",
            kind,
            Unit.ONE,
            en("Table 5.2", Status.READ)));
    if (kind == 4) {
      return new Check.NotAssessed(
          subject,
          clause,
          "The wall is so thin that it buckles before it yields (class 4); buckling of shells by"
              + " EN 1993-1-6 is not calculated here.",
          steps,
          findings);
    }
    Step squash = AXIAL.at(s.area_m2(), fy, gammaM);
    double w = kind <= 2 ? s.plasticModulus_m3() : s.elasticModulus_m3();
    Step bending = BENDING.at(w, fy, gammaM);
    double n = Math.abs(f.axial_N());
    Formula sum = kind <= 2 ? PLASTIC_SUM : ELASTIC_SUM;
    Step u =
        n < squash.si()
            ? sum.at(f.moment_Nm(), bending.si(), n, squash.si())
            : SQUASHED.at(n, squash.si());
    steps.addAll(List.of(squash, bending, u));
    return new Check.Interaction(subject, clause, u, steps, findings);
  }

  /** Shear with torsion. */
  static Check shear(
      Tube tube, SectionForces f, double gammaM, Subject subject, List<Finding> findings) {
    Section s = tube.sectionAt(f.along_m());
    double fy = tube.steel().yield_Pa();
    Step v = SHEAR.at(s.area_m2(), fy, gammaM);
    Step t = TORSION.at(s.elasticModulus_m3(), fy, gammaM);
    Step u = SHEAR_SUM.at(f.shear_N(), v.si(), Math.abs(f.torque_Nm()), t.si());
    return new Check.Interaction(
        subject, en("6.2.7(9)", Status.RECALLED), u, List.of(v, t, u), findings);
  }
}
