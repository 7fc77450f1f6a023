package org.mastwright.rotor;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.design.Rotor;
import org.mastwright.units.Unit;
import org.mastwright.working.Formula;
import org.mastwright.working.Formula.Var;

/**
 * Cases B, yawing, and C, yaw error, of the simplified model of IEC 61400-2, 7.4.3 and 7.4.4: for
 * rotors that yaw passively. Recalled. Ultimate loads, all with their characteristic values.
 */
public final class IecYawLoads {
  /** Greatest lift coefficient of a blade when none is known. */
  public static final double MAXIMUM_CL = 2.0;

  /** Greatest swept area in the scope of the standard. */
  private static final double SCOPE_M2 = 200;

  private static final Var R = new Var("R", Unit.M);
  private static final Var OMEGA = new Var("Ω", Unit.RADPS);
  private static final Var YAW = new Var("ω_yaw", Unit.RADPS);
  private static final Var INERTIA = new Var("I_B", Unit.KGM2);
  private static final Var THRUST_RANGE = new Var("ΔF_x,shaft", Unit.N);

  public static final Formula YAW_RATE =
      new Formula(
          "ω_yaw",
          Unit.RADPS,
          "3 − 0.01·max(π·{R}² − 2, 0)",
          IecRotorLoads.clause("7.4.3, case B"),
          List.of(R),
          v -> yawRate_radps(v[0]));

  public static final Formula BLADE_YAWING =
      new Formula(
          "M_yB",
          Unit.NM,
          "{m_B}·{ω_yaw}²·{L_rt}·{R_cog} + 2·{ω_yaw}·{I_B}·{Ω} + {R}/9·{ΔF_x,shaft}",
          IecRotorLoads.clause("7.4.3, case B"),
          List.of(
              new Var("m_B", Unit.KG),
              new Var("R_cog", Unit.M),
              INERTIA,
              YAW,
              new Var("L_rt", Unit.M),
              OMEGA,
              R,
              THRUST_RANGE),
          v ->
              bladeYawing_Nm(
                  new Rotor.Blade(v[0], v[1], v[2], true), v[3], v[4], v[5], v[6], v[7]));

  public static final Formula SHAFT_YAWING =
      new Formula(
          "M_shaft",
          Unit.NM,
          "{B}·{ω_yaw}·{Ω}·{I_B} + {m_r}·{g}·{L_rb} + {R}/6·{ΔF_x,shaft}",
          IecRotorLoads.clause("7.4.3, case B, three blades or more"),
          shaftVars(List.of(new Var("B", Unit.ONE))),
          v -> shaftYawing_Nm(v[0], v[1], v[2], v[3], new Overhung(v[4], v[5], v[6], v[7], v[8])));

  public static final Formula SHAFT_YAWING_TWO_BLADES =
      new Formula(
          "M_shaft",
          Unit.NM,
          "4·{ω_yaw}·{Ω}·{I_B} + {m_r}·{g}·{L_rb} + {R}/6·{ΔF_x,shaft}",
          IecRotorLoads.clause("7.4.3, case B, two blades"),
          shaftVars(List.of()),
          v ->
              shaftYawingTwoBlades_Nm(
                  v[0], v[1], v[2], new Overhung(v[3], v[4], v[5], v[6], v[7])));

  public static final Formula BLADE_YAW_ERROR =
      new Formula(
          "M_yB",
          Unit.NM,
          "1/8·{ρ}·{A_B}·{C_l,max}·{R}³·{Ω}²·(1 + 4/(3·{λ}) + (1/{λ})²)",
          IecRotorLoads.clause("7.4.4, case C"),
          List.of(
              new Var("ρ", Unit.KGPM3),
              new Var("A_B", Unit.M2),
              new Var("C_l,max", Unit.ONE),
              R,
              OMEGA,
              new Var("λ", Unit.ONE)),
          v -> bladeYawError_Nm(v[0], v[1], v[2], v[3], v[4], v[5]));

  private IecYawLoads() {}

  private static List<Var> shaftVars(List<Var> before) {
    List<Var> all = new ArrayList<>(before);
    all.addAll(
        List.of(
            YAW,
            OMEGA,
            INERTIA,
            new Var("m_r", Unit.KG),
            new Var("g", Unit.MPS2),
            new Var("L_rb", Unit.M),
            R,
            THRUST_RANGE));
    return all;
  }

  /**
   * What bends the shaft besides the gyroscopic moment.
   *
   * @param rotor_kg blades and hub
   * @param bearingArm_m from the rotor centre to the first bearing
   * @param thrustRange_N of case A
   */
  public record Overhung(
      double rotor_kg,
      double gravity_mps2,
      double bearingArm_m,
      double radius_m,
      double thrustRange_N) {
    /** {@code m_r g L_rb + R/6 ΔF_x,shaft}. */
    double bending_Nm() {
      return rotor_kg * gravity_mps2 * bearingArm_m + radius_m / 6 * thrustRange_N;
    }
  }

  /**
   * Greatest yaw rate (rad/s): 3 for a swept area up to 2 m², {@code 3 − 0.01(πR² − 2)} above.
   *
   * @throws IllegalArgumentException above 200 m², the scope of the standard (the rate would fall
   *     to zero and below)
   */
  public static double yawRate_radps(double radius_m) {
    double swept_m2 = Math.PI * radius_m * radius_m;
    if (!(swept_m2 <= SCOPE_M2)) {
      throw new IllegalArgumentException(
          "yaw rate for " + swept_m2 + " m² swept; the standard ends at " + SCOPE_M2 + " m²");
    }
    return 3 - 0.01 * Math.max(swept_m2 - 2, 0);
  }

  /**
   * Case B: moment at the blade root out of the rotor plane (N·m): {@code m_B ω_yaw² L_rt R_cog + 2
   * ω_yaw I_B ω + R/9 ΔF_x,shaft}.
   *
   * @param blade mass, distance of its centre from the shaft, inertia about the flap axis at the
   *     root (about the shaft is on the safe side)
   * @param yawArm_m from the rotor centre to the yaw axis
   * @param omega_radps design rotor speed
   * @param thrustRange_N of case A
   */
  public static double bladeYawing_Nm(
      Rotor.Blade blade,
      double yaw_radps,
      double yawArm_m,
      double omega_radps,
      double radius_m,
      double thrustRange_N) {
    return blade.mass_kg() * yaw_radps * yaw_radps * yawArm_m * blade.cogRadius_m()
        + 2 * yaw_radps * blade.inertia_kgm2() * omega_radps
        + radius_m / 9 * thrustRange_N;
  }

  /**
   * Case B, three blades or more: bending moment of the shaft at its first bearing (N·m): {@code B
   * ω_yaw ω I_B + m_r g L_rb + R/6 ΔF_x,shaft}.
   *
   * @throws IllegalArgumentException below three blades, where this is on the unsafe side
   */
  public static double shaftYawing_Nm(
      double bladesCoefficient,
      double yaw_radps,
      double omega_radps,
      double bladeInertia_kgm2,
      Overhung overhung) {
    if (!(bladesCoefficient >= 3)) {
      throw new IllegalArgumentException("not for " + bladesCoefficient + " blades; 3 or more");
    }
    return bladesCoefficient * yaw_radps * omega_radps * bladeInertia_kgm2 + overhung.bending_Nm();
  }

  /**
   * Case B, two blades: {@code 4 ω_yaw ω I_B + m_r g L_rb + R/6 ΔF_x,shaft} (N·m). The gyroscopic
   * moment of two blades pulses to twice its mean.
   */
  public static double shaftYawingTwoBlades_Nm(
      double yaw_radps, double omega_radps, double bladeInertia_kgm2, Overhung overhung) {
    return 4 * yaw_radps * omega_radps * bladeInertia_kgm2 + overhung.bending_Nm();
  }

  /**
   * Case C: moment at the blade root out of the rotor plane with the whole blade at its greatest
   * lift (N·m): {@code 1/8 ρ A_B C_l,max R³ ω² (1 + 4/(3λ) + (1/λ)²)}.
   *
   * @param blade_m2 area of one blade seen flat
   * @param maximumLiftCoefficient {@link #MAXIMUM_CL} when none is known
   * @param tipSpeedRatio the design one, above 0
   */
  public static double bladeYawError_Nm(
      double density_kgpm3,
      double blade_m2,
      double maximumLiftCoefficient,
      double radius_m,
      double omega_radps,
      double tipSpeedRatio) {
    double inverse = 1 / tipSpeedRatio;
    double tip_mps = radius_m * omega_radps;
    double tipPressure_Pa = density_kgpm3 * tip_mps * tip_mps;
    double wind = 1 + 4 / (3 * tipSpeedRatio) + inverse * inverse;
    return tipPressure_Pa / 8 * blade_m2 * maximumLiftCoefficient * radius_m * wind;
  }
}
