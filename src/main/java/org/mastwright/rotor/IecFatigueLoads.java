package org.mastwright.rotor;

import java.util.List;
import org.mastwright.units.Unit;
import org.mastwright.working.Formula;
import org.mastwright.working.Formula.Var;

/**
 * Case A, normal operation, of the simplified model of IEC 61400-2, 7.4.2: ranges (greatest less
 * least) for fatigue, and the design values they need (7.4.1). Recalled. For rotors on a level
 * shaft, two blades or more, rigid hub; of {@code ω} and {@code Q} the design values are meant. The
 * formulas hold for positive arguments; none is limited further.
 */
public final class IecFatigueLoads {
  private static final Var R = new Var("R", Unit.M);
  private static final Var OMEGA = new Var("Ω", Unit.RADPS);
  private static final Var TORQUE = new Var("Q", Unit.NM);
  private static final Var BLADES = new Var("B", Unit.ONE);
  private static final Var RATIO = new Var("λ", Unit.ONE);
  private static final Var G = new Var("g", Unit.MPS2);
  private static final Var BLADE_MASS = new Var("m_B", Unit.KG);
  private static final Var COG = new Var("R_cog", Unit.M);
  private static final Var ROTOR_MASS = new Var("m_r", Unit.KG);

  public static final Formula DESIGN_WIND =
      new Formula(
          "V_design",
          Unit.MPS,
          "1.4·{V_ave}",
          IecRotorLoads.clause("7.4.1"),
          List.of(new Var("V_ave", Unit.MPS)),
          v -> designWind_mps(v[0]));

  public static final Formula DESIGN_TIP_SPEED_RATIO =
      new Formula(
          "λ",
          Unit.ONE,
          "{Ω}·{R}/{V_design}",
          IecRotorLoads.clause("7.4.1"),
          List.of(OMEGA, R, new Var("V_design", Unit.MPS)),
          v -> IecRotorLoads.tipSpeedRatio(v[0], v[1], v[2]));

  public static final Formula ECCENTRICITY =
      new Formula(
          "e_r",
          Unit.MM,
          "0.005·{R}",
          IecRotorLoads.clause("7.4.2, case A"),
          List.of(R),
          v -> eccentricity_m(v[0]));

  public static final Formula BLADE_PULL =
      new Formula(
          "ΔF_zB",
          Unit.N,
          "2·{m_B}·{R_cog}·{Ω}²",
          IecRotorLoads.clause("7.4.2, case A"),
          List.of(BLADE_MASS, COG, OMEGA),
          v -> bladePull_N(v[0], v[1], v[2]));

  public static final Formula BLADE_EDGEWISE =
      new Formula(
          "ΔM_xB",
          Unit.NM,
          "{Q}/{B} + 2·{m_B}·{g}·{R_cog}",
          IecRotorLoads.clause("7.4.2, case A"),
          List.of(TORQUE, BLADES, BLADE_MASS, G, COG),
          v -> bladeEdgewise_Nm(v[0], v[1], v[2], v[3], v[4]));

  public static final Formula BLADE_FLAPWISE =
      new Formula(
          "ΔM_yB",
          Unit.NM,
          "{λ}·{Q}/{B}",
          IecRotorLoads.clause("7.4.2, case A"),
          List.of(RATIO, TORQUE, BLADES),
          v -> bladeFlapwise_Nm(v[0], v[1], v[2]));

  public static final Formula SHAFT_THRUST =
      new Formula(
          "ΔF_x,shaft",
          Unit.N,
          "3/2·{λ}·{Q}/{R}",
          IecRotorLoads.clause("7.4.2, case A"),
          List.of(RATIO, TORQUE, R),
          v -> shaftThrust_N(v[0], v[1], v[2]));

  public static final Formula SHAFT_TORQUE =
      new Formula(
          "ΔM_x,shaft",
          Unit.NM,
          "{Q} + 2·{m_r}·{g}·{e_r}",
          IecRotorLoads.clause("7.4.2, case A"),
          List.of(TORQUE, ROTOR_MASS, G, new Var("e_r", Unit.MM)),
          v -> shaftTorque_Nm(v[0], v[1], v[2], v[3]));

  public static final Formula SHAFT_BENDING =
      new Formula(
          "ΔM_shaft",
          Unit.NM,
          "2·{m_r}·{g}·{L_rb} + {R}/6·{ΔF_x,shaft}",
          IecRotorLoads.clause("7.4.2, case A"),
          List.of(ROTOR_MASS, G, new Var("L_rb", Unit.M), R, new Var("ΔF_x,shaft", Unit.N)),
          v -> shaftBending_Nm(v[0], v[1], v[2], v[3], v[4]));

  private IecFatigueLoads() {}

  /** Design wind speed: {@code 1.4 V_ave}, of the mean wind at the hub (m/s). */
  public static double designWind_mps(double mean_mps) {
    return 1.4 * mean_mps;
  }

  /** Distance of the rotor's centre of mass from the shaft axis when not measured (m). */
  public static double eccentricity_m(double radius_m) {
    return 0.005 * radius_m;
  }

  /**
   * Range of the pull along a blade at its root (N): {@code 2 m_B R_cog ω²}.
   *
   * @param blade_kg mass of one blade
   * @param cogRadius_m from the shaft axis to its centre of mass
   * @param omega_radps design rotor speed
   */
  public static double bladePull_N(double blade_kg, double cogRadius_m, double omega_radps) {
    return 2 * blade_kg * cogRadius_m * omega_radps * omega_radps;
  }

  /**
   * Range of the moment at the blade root in the rotor plane (N·m): its share of the torque, and
   * its weight up and down: {@code Q/B + 2 m_B g R_cog}.
   */
  public static double bladeEdgewise_Nm(
      double torque_Nm,
      double bladesCoefficient,
      double blade_kg,
      double gravity_mps2,
      double cogRadius_m) {
    return torque_Nm / bladesCoefficient + 2 * blade_kg * gravity_mps2 * cogRadius_m;
  }

  /** Range of the moment at the blade root out of the rotor plane (N·m): {@code λ Q/B}. */
  public static double bladeFlapwise_Nm(
      double tipSpeedRatio, double torque_Nm, double bladesCoefficient) {
    return tipSpeedRatio * torque_Nm / bladesCoefficient;
  }

  /** Range of the thrust on the shaft (N): {@code 3/2 λ Q/R}. */
  public static double shaftThrust_N(double tipSpeedRatio, double torque_Nm, double radius_m) {
    return 1.5 * tipSpeedRatio * torque_Nm / radius_m;
  }

  /**
   * Range of the moment about the shaft (N·m): the torque, and the weight of a rotor out of
   * balance: {@code Q + 2 m_r g e_r}.
   *
   * @param rotor_kg blades and hub
   */
  public static double shaftTorque_Nm(
      double torque_Nm, double rotor_kg, double gravity_mps2, double eccentricity_m) {
    return torque_Nm + 2 * rotor_kg * gravity_mps2 * eccentricity_m;
  }

  /**
   * Range of the bending moment of the shaft at its first bearing (N·m): {@code 2 m_r g L_rb + R/6
   * ΔF_x,shaft}, the second part for thrust off the centre.
   *
   * @param bearingArm_m from the rotor centre to the first bearing
   * @param thrustRange_N of {@link #shaftThrust_N}
   */
  public static double shaftBending_Nm(
      double rotor_kg,
      double gravity_mps2,
      double bearingArm_m,
      double radius_m,
      double thrustRange_N) {
    return 2 * rotor_kg * gravity_mps2 * bearingArm_m + radius_m / 6 * thrustRange_N;
  }
}
