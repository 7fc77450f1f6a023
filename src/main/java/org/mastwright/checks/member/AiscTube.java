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
 * Round tubes by AISC 360 (LRFD): E3, F8, G5, H1, H3. Resistance factors 0.90; with the loads of
 * IEC 61400-2 the same 0.90 is kept, which is below that standard's 1/1.1.
 */
public final class AiscTube {
  static final double PHI = 0.90;

  private static Clause aisc(String number) {
    return new Clause("AISC 360", "2016", number, Status.RECALLED);
  }

  static final Formula EULER =
      new Formula(
          "F_e",
          Unit.MPA,
          "π²·{E}/({L}/{r})²",
          aisc("E3-4"),
          List.of(new Var("E", Unit.MPA), new Var("L", Unit.M), new Var("r", Unit.MM)),
          v -> euler_Pa(v[0], v[1], v[2]));

  static final Formula SHORT =
      new Formula(
          "F_cr",
          Unit.MPA,
          "{F_y}·0.658^({F_y}/{F_e})",
          aisc("E3-2"),
          List.of(new Var("F_y", Unit.MPA), new Var("F_e", Unit.MPA)),
          v -> v[0] * Math.pow(0.658, v[0] / v[1]));

  static final Formula LONG =
      new Formula(
          "F_cr",
          Unit.MPA,
          "0.877·{F_e}",
          aisc("E3-3"),
          List.of(new Var("F_e", Unit.MPA)),
          v -> 0.877 * v[0]);

  static final Formula COMPRESSION =
      new Formula(
          "φP_n",
          Unit.KN,
          "{φ}·{F_cr}·{A}",
          aisc("E3-1"),
          List.of(new Var("φ", Unit.ONE), new Var("F_cr", Unit.MPA), new Var("A", Unit.MM2)),
          v -> v[0] * v[1] * v[2]);

  static final Formula YIELD_MOMENT =
      new Formula(
          "φM_n",
          Unit.KNM,
          "{φ}·{F_y}·{Z}",
          aisc("F8-1"),
          List.of(new Var("φ", Unit.ONE), new Var("F_y", Unit.MPA), new Var("Z", Unit.CM3)),
          v -> v[0] * v[1] * v[2]);

  static final Formula LOCAL_MOMENT =
      new Formula(
          "φM_n",
          Unit.KNM,
          "{φ}·(0.021·{E}/({D}/{t}) + {F_y})·{S}",
          aisc("F8-2"),
          List.of(
              new Var("φ", Unit.ONE),
              new Var("E", Unit.MPA),
              new Var("D", Unit.MM),
              new Var("t", Unit.MM),
              new Var("F_y", Unit.MPA),
              new Var("S", Unit.CM3)),
          v -> v[0] * (0.021 * v[1] / (v[2] / v[3]) + v[4]) * v[5]);

  static final Formula HIGH_SUM =
      new Formula(
          "u",
          Unit.ONE,
          "{P}/{φP_n} + 8/9·{M}/{φM_n}",
          aisc("H1-1a"),
          sumVars(),
          v -> v[0] / v[1] + 8.0 / 9 * v[2] / v[3]);

  static final Formula LOW_SUM =
      new Formula(
          "u",
          Unit.ONE,
          "{P}/(2·{φP_n}) + {M}/{φM_n}",
          aisc("H1-1b"),
          sumVars(),
          v -> v[0] / (2 * v[1]) + v[2] / v[3]);

  static final Formula SHEAR =
      new Formula(
          "φV_n",
          Unit.KN,
          "{φ}·0.6·{F_y}·{A}/2",
          aisc("G5-1"),
          List.of(new Var("φ", Unit.ONE), new Var("F_y", Unit.MPA), new Var("A", Unit.MM2)),
          v -> v[0] * 0.6 * v[1] * v[2] / 2);

  static final Formula TORSION =
      new Formula(
          "φT_n",
          Unit.KNM,
          "{φ}·0.6·{F_y}·π·({D} − {t})²·{t}/2",
          aisc("H3-1"),
          List.of(
              new Var("φ", Unit.ONE),
              new Var("F_y", Unit.MPA),
              new Var("D", Unit.MM),
              new Var("t", Unit.MM)),
          v -> v[0] * 0.6 * v[1] * Math.PI * (v[2] - v[3]) * (v[2] - v[3]) * v[3] / 2);

  static final Formula SHEAR_SUM =
      new Formula(
          "u",
          Unit.ONE,
          "{V}/{φV_n} + {T}/{φT_n}",
          aisc("H3-6, shear and torsion"),
          List.of(
              new Var("V", Unit.KN),
              new Var("φV_n", Unit.KN),
              new Var("T", Unit.KNM),
              new Var("φT_n", Unit.KNM)),
          v -> v[0] / v[1] + v[2] / v[3]);

  private AiscTube() {}

  private static List<Var> sumVars() {
    return List.of(
        new Var("P", Unit.KN),
        new Var("φP_n", Unit.KN),
        new Var("M", Unit.KNM),
        new Var("φM_n", Unit.KNM));
  }

  static double euler_Pa(double modulus_Pa, double length_m, double radius_m) {
    double slender = length_m / radius_m;
    return Math.PI * Math.PI * modulus_Pa / (slender * slender);
  }

  /** Critical stress: E3-2 to {@code F_y/F_e} of 2.25, E3-3 beyond. */
  public static double critical_Pa(double yield_Pa, double euler_Pa) {
    return yield_Pa / euler_Pa <= 2.25
        ? yield_Pa * Math.pow(0.658, yield_Pa / euler_Pa)
        : 0.877 * euler_Pa;
  }

  /** D/t against 0.07 E/Fy (compact) and 0.31 E/Fy (slender). */
  static boolean compact(Section s, double modulus_Pa, double yield_Pa) {
    return s.outside_m() / s.wall_m() <= 0.07 * modulus_Pa / yield_Pa;
  }

  /** Local buckling in compression starts at 0.11 E/Fy. */
  static boolean slender(Section s, double modulus_Pa, double yield_Pa) {
    return s.outside_m() / s.wall_m() > 0.11 * modulus_Pa / yield_Pa;
  }

  private static double bending_Nm(Section s, double e, double fy) {
    return compact(s, e, fy)
        ? PHI * fy * s.plasticModulus_m3()
        : PHI * (0.021 * e / (s.outside_m() / s.wall_m()) + fy) * s.elasticModulus_m3();
  }

  /** For the search, without steps. */
  static double utilisation(Tube tube, SectionForces f, double span_m) {
    Section s = tube.sectionAt(f.along_m());
    double e = tube.steel().modulus_Pa();
    double fy = tube.steel().yield_Pa();
    double p = Math.abs(f.axial_N());
    double fcr = critical_Pa(fy, euler_Pa(e, span_m, s.radiusOfGyration_m()));
    double pn = PHI * fcr * s.area_m2();
    double mn = bending_Nm(s, e, fy);
    return p / pn >= 0.2
        ? p / pn + 8.0 / 9 * f.moment_Nm() / mn
        : p / (2 * pn) + f.moment_Nm() / mn;
  }

  /**
   * Axial force with bending.
   *
   * @param span_m buckling length with K = 1, as direct analysis allows
   */
  static Check strength(
      Tube tube, SectionForces f, double span_m, Subject subject, List<Finding> findings) {
    Section s = tube.sectionAt(f.along_m());
    double e = tube.steel().modulus_Pa();
    double fy = tube.steel().yield_Pa();
    Clause clause = aisc("H1");
    if (!s.isRound() || slender(s, e, fy)) {
      return new Check.NotAssessed(
          subject,
          clause,
          s.isRound()
              ? "D/t is above 0.11 E/F_y: slender in compression, section E7 is not calculated here."
              : "Many-sided tubes are not in AISC 360; take strength: en-1993.",
          List.of(),
          findings);
    }
    List<Step> steps = new ArrayList<>();
    Step fe = EULER.at(e, span_m, s.radiusOfGyration_m());
    Step fcr = fy / fe.si() <= 2.25 ? SHORT.at(fy, fe.si()) : LONG.at(fe.si());
    Step pn = COMPRESSION.at(PHI, fcr.si(), s.area_m2());
    Step mn =
        compact(s, e, fy)
            ? YIELD_MOMENT.at(PHI, fy, s.plasticModulus_m3())
            : LOCAL_MOMENT.at(PHI, e, s.outside_m(), s.wall_m(), fy, s.elasticModulus_m3());
    double p = Math.abs(f.axial_N());
    Formula sum = p / pn.si() >= 0.2 ? HIGH_SUM : LOW_SUM;
    Step u = sum.at(p, pn.si(), f.moment_Nm(), mn.si());
    steps.addAll(List.of(fe, fcr, pn, mn, u));
    return new Check.Interaction(subject, clause, u, steps, findings);
  }

  /** Shear with torsion. */
  static Check shear(Tube tube, SectionForces f, Subject subject, List<Finding> findings) {
    Section s = tube.sectionAt(f.along_m());
    double fy = tube.steel().yield_Pa();
    Step v = SHEAR.at(PHI, fy, s.area_m2());
    Step t = TORSION.at(PHI, fy, s.outside_m(), s.wall_m());
    Step u = SHEAR_SUM.at(f.shear_N(), v.si(), Math.abs(f.torque_Nm()), t.si());
    return new Check.Interaction(subject, aisc("G5, H3"), u, List.of(v, t, u), findings);
  }
}
