package org.mastwright.rotor;

import java.util.List;
import org.mastwright.units.Unit;
import org.mastwright.working.Clause;
import org.mastwright.working.Formula;
import org.mastwright.working.Formula.Var;
import org.mastwright.working.Status;

/**
 * Loads of the simplified model of IEC 61400-2, 7.4, cases D, H and I; recalled from edition 2 and
 * kept in edition 3. SI throughout; {@code n} of the standard is {@code ω} here.
 */
public final class IecRotorLoads {
  /** Drag coefficient of a parked blade seen flat. */
  public static final double PARKED_CD = 1.5;

  /** Thrust coefficient of case D. */
  public static final double MAXIMUM_THRUST_CT = 0.5;

  static Clause clause(String number) {
    return new Clause("IEC 61400-2", "2013", number, Status.RECALLED);
  }

  public static final Formula EFFICIENCY =
      new Formula(
          "η",
          Unit.ONE,
          "min(0.6 + 0.005·{P}/1000, 0.7)",
          clause("7.4.1"),
          List.of(new Var("P", Unit.W)),
          v -> efficiency(v[0]));

  public static final Formula TORQUE =
      new Formula(
          "Q",
          Unit.NM,
          "{P}/({η}·{Ω})",
          clause("7.4.1"),
          List.of(new Var("P", Unit.W), new Var("η", Unit.ONE), new Var("Ω", Unit.RADPS)),
          v -> torque_Nm(v[0], v[1], v[2]));

  public static final Formula CASE_D =
      new Formula(
          "F_D",
          Unit.KN,
          "{C_T}·3.125·{ρ}·{V_ave}²·π·{R}²",
          clause("7.4.5, case D"),
          List.of(
              new Var("C_T", Unit.ONE),
              new Var("ρ", Unit.KGPM3),
              new Var("V_ave", Unit.MPS),
              new Var("R", Unit.M)),
          v -> caseD_N(v[0], v[1], v[2], v[3]));

  public static final Formula CASE_H_PARKED =
      new Formula(
          "F_H,parked",
          Unit.KN,
          "{B}·{C_d}·0.5·{ρ}·{V_e50}²·{A_B}",
          clause("7.4.9, case H"),
          List.of(
              new Var("B", Unit.ONE),
              new Var("C_d", Unit.ONE),
              new Var("ρ", Unit.KGPM3),
              new Var("V_e50", Unit.MPS),
              new Var("A_B", Unit.M2)),
          v -> parked_N(v[0], v[1], v[2], v[3], v[4]));

  public static final Formula TIP_SPEED_RATIO =
      new Formula(
          "λ_e50",
          Unit.ONE,
          "{Ω}·{R}/{V_e50}",
          clause("7.4.9, case H"),
          List.of(new Var("Ω", Unit.RADPS), new Var("R", Unit.M), new Var("V_e50", Unit.MPS)),
          v -> tipSpeedRatio(v[0], v[1], v[2]));

  public static final Formula CASE_H_SPINNING =
      new Formula(
          "F_H,spinning",
          Unit.KN,
          "0.17·{B}·{A_B}·{λ_e50}²·{ρ}·{V_e50}²",
          clause("7.4.9, case H"),
          List.of(
              new Var("B", Unit.ONE),
              new Var("A_B", Unit.M2),
              new Var("λ_e50", Unit.ONE),
              new Var("ρ", Unit.KGPM3),
              new Var("V_e50", Unit.MPS)),
          v -> spinning_N(v[0], v[1], v[2], v[3], v[4]));

  public static final Formula PART_DRAG =
      new Formula(
          "F",
          Unit.N,
          "{C_f}·0.5·{ρ}·{V}²·{A}",
          clause("7.4.9, 7.4.10"),
          List.of(
              new Var("C_f", Unit.ONE),
              new Var("ρ", Unit.KGPM3),
              new Var("V", Unit.MPS),
              new Var("A", Unit.M2)),
          v -> v[0] * 0.5 * v[1] * v[2] * v[2] * v[3]);

  private IecRotorLoads() {}

  /** Drive train efficiency: {@code 0.6 + 0.005 P[kW]} to 20 kW, 0.7 above. */
  public static double efficiency(double power_W) {
    return Math.min(0.6 + 0.005 * power_W / 1000, 0.7);
  }

  public static double torque_Nm(double power_W, double efficiencyRatio, double omega_radps) {
    return power_W / (efficiencyRatio * omega_radps);
  }

  /** Speed of the blade tip over that of the wind: {@code Ω R/V}. */
  public static double tipSpeedRatio(double omega_radps, double radius_m, double wind_mps) {
    return omega_radps * radius_m / wind_mps;
  }

  /** Case D: greatest thrust at 2.5 times the mean wind. */
  public static double caseD_N(double ct, double density_kgpm3, double mean_mps, double radius_m) {
    return ct * 3.125 * density_kgpm3 * mean_mps * mean_mps * Math.PI * radius_m * radius_m;
  }

  /** Case H: thrust of the stopped rotor. */
  public static double parked_N(
      double bladesCoefficient, double cd, double density_kgpm3, double wind_mps, double blade_m2) {
    return bladesCoefficient * cd * 0.5 * density_kgpm3 * wind_mps * wind_mps * blade_m2;
  }

  /** Case H: thrust of the spinning rotor. */
  public static double spinning_N(
      double bladesCoefficient,
      double blade_m2,
      double tipSpeedRatio,
      double density_kgpm3,
      double wind_mps) {
    return 0.17
        * bladesCoefficient
        * blade_m2
        * tipSpeedRatio
        * tipSpeedRatio
        * density_kgpm3
        * wind_mps
        * wind_mps;
  }
}
