package org.mastwright.rotor;

import java.util.List;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.mastwright.units.Unit;
import org.mastwright.working.Clause;
import org.mastwright.working.Formula;
import org.mastwright.working.Formula.Var;
import org.mastwright.working.Status;

/** Momentum theory of the disc: {@code a} is the share by which the wind is slowed at the disc. */
public final class ActuatorDisc {
  /** Greatest power coefficient, 16/27. */
  public static final double OPTIMUM_CP = 16.0 / 27;

  private static final Clause MOMENTUM =
      new Clause("momentum theory (Betz)", "-", "actuator disc", Status.RECALLED);
  private static final Clause BUHL =
      new Clause("NREL/TP-500-36834", "2005", "thrust at high induction", Status.READ);

  public static final Formula CT =
      new Formula(
          "C_T",
          Unit.ONE,
          "4·{a}·(1 − {a})",
          MOMENTUM,
          List.of(new Var("a", Unit.ONE)),
          v -> ct(v[0]));

  public static final Formula CP =
      new Formula(
          "C_P",
          Unit.ONE,
          "4·{a}·(1 − {a})²",
          MOMENTUM,
          List.of(new Var("a", Unit.ONE)),
          v -> cp(v[0]));

  public static final Formula THRUST =
      new Formula(
          "T",
          Unit.KN,
          "{C_T}·0.5·{ρ}·{A}·{V}²",
          MOMENTUM,
          List.of(
              new Var("C_T", Unit.ONE),
              new Var("ρ", Unit.KGPM3),
              new Var("A", Unit.M2),
              new Var("V", Unit.MPS)),
          v -> v[0] * 0.5 * v[1] * v[2] * v[3] * v[3]);

  public static final Formula POWER_COEFFICIENT =
      new Formula(
          "C_P",
          Unit.ONE,
          "{P}/({η}·0.5·{ρ}·{A}·{V}³)",
          MOMENTUM,
          List.of(
              new Var("P", Unit.W),
              new Var("η", Unit.ONE),
              new Var("ρ", Unit.KGPM3),
              new Var("A", Unit.M2),
              new Var("V", Unit.MPS)),
          v -> v[0] / (v[1] * 0.5 * v[2] * v[3] * v[4] * v[4] * v[4]));

  public static final Formula CT_HIGH =
      new Formula(
          "C_T",
          Unit.ONE,
          "8/9 + (4·{F} − 40/9)·{a} + (50/9 − 4·{F})·{a}²",
          BUHL,
          List.of(new Var("a", Unit.ONE), new Var("F", Unit.ONE)),
          v -> buhlCt(v[0], v[1]));

  private ActuatorDisc() {}

  /** Thrust coefficient, {@code 4a(1 − a)}; valid to a = 0.4. */
  public static double ct(double inductionFactor) {
    return 4 * inductionFactor * (1 - inductionFactor);
  }

  /** Power coefficient, {@code 4a(1 − a)²}. */
  public static double cp(double inductionFactor) {
    double b = 1 - inductionFactor;
    return 4 * inductionFactor * b * b;
  }

  /** Buhl's thrust for {@code a > 0.4}; {@code F} is the loss factor. */
  public static double buhlCt(double inductionFactor, double lossFactor) {
    return 8.0 / 9
        + (4 * lossFactor - 40.0 / 9) * inductionFactor
        + (50.0 / 9 - 4 * lossFactor) * inductionFactor * inductionFactor;
  }

  /** Its inverse, used when {@code CT > 0.96 F}. */
  public static double buhlInduction(double ct, double lossFactor) {
    double f = lossFactor;
    double root = Math.sqrt(ct * (50 - 36 * f) + 12 * f * (3 * f - 4));
    return (18 * f - 20 - 3 * root) / (36 * f - 50);
  }

  /** The lesser induction that gives a power coefficient; one third for the optimum and above. */
  public static double inductionForCp(double cp) {
    if (cp >= OPTIMUM_CP) {
      return 1.0 / 3;
    }
    return new BrentSolver(1e-14).solve(200, a -> cp(a) - cp, 0, 1.0 / 3);
  }
}
