package org.mastwright.rotor;

import java.util.List;
import org.mastwright.units.Unit;
import org.mastwright.working.Formula;
import org.mastwright.working.Formula.Var;

/**
 * Loads of blades, shaft and tower in cases E to H and J of the simplified model of IEC 61400-2,
 * 7.4.6 to 7.4.9 and 7.4.11. Recalled. Ultimate loads with their characteristic values; the
 * formulas hold for positive arguments and none is limited further.
 */
public final class IecBladeAndShaftLoads {
  /** Case F: short-circuit torque over design torque when none is measured. */
  public static final double SHORT_CIRCUIT_FACTOR = 2.0;

  private static final Var BLADES = new Var("B", Unit.ONE);
  private static final Var BLADE_MASS = new Var("m_B", Unit.KG);
  private static final Var COG = new Var("R_cog", Unit.M);
  private static final Var G = new Var("g", Unit.MPS2);
  private static final Var TOP_SPEED = new Var("Ω_max", Unit.RADPS);
  private static final Var TORQUE = new Var("Q", Unit.NM);
  private static final Var SHAFT_TORQUE = new Var("M_x,shaft", Unit.NM);
  private static final List<Var> BLADE_IN_WIND =
      List.of(new Var("ρ", Unit.KGPM3), new Var("V_e50", Unit.MPS), new Var("A_B", Unit.M2));

  public static final Formula BLADE_OVERSPEED =
      new Formula(
          "F_zB",
          Unit.N,
          "{m_B}·{Ω_max}²·{R_cog}",
          IecRotorLoads.clause("7.4.6, case E"),
          List.of(BLADE_MASS, TOP_SPEED, COG),
          v -> bladeOverspeed_N(v[0], v[1], v[2]));

  public static final Formula SHAFT_OVERSPEED =
      new Formula(
          "M_shaft",
          Unit.NM,
          "{m_r}·{g}·{L_rb} + {m_r}·{e_r}·{Ω_max}²·{L_rb}",
          IecRotorLoads.clause("7.4.6, case E"),
          List.of(
              new Var("m_r", Unit.KG),
              G,
              new Var("L_rb", Unit.M),
              new Var("e_r", Unit.MM),
              TOP_SPEED),
          v -> shaftOverspeed_Nm(v[0], v[1], v[2], v[3], v[4]));

  public static final Formula SHAFT_SHORT_CIRCUIT =
      new Formula(
          "M_x,shaft",
          Unit.NM,
          "{G}·{Q}",
          IecRotorLoads.clause("7.4.7, case F"),
          List.of(new Var("G", Unit.ONE), TORQUE),
          v -> shaftShortCircuit_Nm(v[0], v[1]));

  public static final Formula BLADE_SHORT_CIRCUIT =
      new Formula(
          "M_xB",
          Unit.NM,
          "{M_x,shaft}/{B}",
          IecRotorLoads.clause("7.4.7, case F"),
          List.of(SHAFT_TORQUE, BLADES),
          v -> bladeShortCircuit_Nm(v[0], v[1]));

  public static final Formula SHAFT_SHUTDOWN =
      new Formula(
          "M_x,shaft",
          Unit.NM,
          "{M_brake} + {Q}",
          IecRotorLoads.clause("7.4.8, case G"),
          List.of(new Var("M_brake", Unit.NM), TORQUE),
          v -> shaftShutdown_Nm(v[0], v[1]));

  public static final Formula BLADE_SHUTDOWN =
      new Formula(
          "M_xB",
          Unit.NM,
          "{M_x,shaft}/{B} + {m_B}·{g}·{R_cog}",
          IecRotorLoads.clause("7.4.8, case G"),
          List.of(SHAFT_TORQUE, BLADES, BLADE_MASS, G, COG),
          v -> bladeShutdown_Nm(v[0], v[1], v[2], v[3], v[4]));

  public static final Formula BLADE_PARKED =
      new Formula(
          "M_yB",
          Unit.NM,
          "{C_d}·1/4·{ρ}·{V_e50}²·{A_B}·{R}",
          IecRotorLoads.clause("7.4.9, case H, stopped"),
          bladeInWind("C_d"),
          v -> bladeParked_Nm(v[0], v[1], v[2], v[3], v[4]));

  public static final Formula BLADE_SPINNING =
      new Formula(
          "M_yB",
          Unit.NM,
          "{C_l,max}·1/6·{ρ}·{V_e50}²·{A_B}·{R}",
          IecRotorLoads.clause("7.4.9, case H, spinning"),
          bladeInWind("C_l,max"),
          v -> bladeSpinning_Nm(v[0], v[1], v[2], v[3], v[4]));

  public static final Formula TOWER_HANDLING =
      new Formula(
          "M_tower",
          Unit.KNM,
          "2·({m_towertop} + {m_overhang}/2)·{g}·{L_lt}",
          IecRotorLoads.clause("7.4.11, case J"),
          List.of(
              new Var("m_towertop", Unit.KG),
              new Var("m_overhang", Unit.KG),
              G,
              new Var("L_lt", Unit.M)),
          v -> towerHandling_Nm(v[0], v[1], v[2], v[3]));

  private IecBladeAndShaftLoads() {}

  private static List<Var> bladeInWind(String coefficient) {
    return List.of(
        new Var(coefficient, Unit.ONE),
        BLADE_IN_WIND.get(0),
        BLADE_IN_WIND.get(1),
        BLADE_IN_WIND.get(2),
        new Var("R", Unit.M));
  }

  /**
   * Case E, greatest rotor speed: pull along a blade at its root (N): {@code m_B ω_max² R_cog}.
   *
   * @param blade_kg mass of one blade
   * @param greatest_radps greatest rotor speed, measured or by the tip-speed limit
   * @param cogRadius_m from the shaft axis to the blade's centre of mass
   */
  public static double bladeOverspeed_N(
      double blade_kg, double greatest_radps, double cogRadius_m) {
    return blade_kg * greatest_radps * greatest_radps * cogRadius_m;
  }

  /**
   * Case E: bending moment of the shaft at its first bearing by weight and imbalance (N·m): {@code
   * m_r g L_rb + m_r e_r ω_max² L_rb}.
   *
   * @param rotor_kg blades and hub
   * @param bearingArm_m from the rotor centre to the first bearing
   * @param eccentricity_m of the rotor's centre of mass, see {@link IecFatigueLoads#eccentricity_m}
   */
  public static double shaftOverspeed_Nm(
      double rotor_kg,
      double gravity_mps2,
      double bearingArm_m,
      double eccentricity_m,
      double greatest_radps) {
    double imbalance_N = rotor_kg * eccentricity_m * greatest_radps * greatest_radps;
    return (rotor_kg * gravity_mps2 + imbalance_N) * bearingArm_m;
  }

  /**
   * Case F, short circuit at the load connection: moment about the shaft (N·m): {@code G Q}.
   *
   * @param torqueFactor {@link #SHORT_CIRCUIT_FACTOR} when the generator's is not known
   */
  public static double shaftShortCircuit_Nm(double torqueFactor, double torque_Nm) {
    return torqueFactor * torque_Nm;
  }

  /** Case F: moment at the blade root in the rotor plane (N·m): {@code M_x,shaft/B}. */
  public static double bladeShortCircuit_Nm(double shaftTorque_Nm, double bladesCoefficient) {
    return shaftTorque_Nm / bladesCoefficient;
  }

  /**
   * Case G, braking: moment about the shaft (N·m), brake and generator together: {@code M_brake +
   * Q}. A brake on the fast shaft counts with the gear ratio.
   */
  public static double shaftShutdown_Nm(double brake_Nm, double torque_Nm) {
    return brake_Nm + torque_Nm;
  }

  /**
   * Case G: moment at the blade root in the rotor plane (N·m): {@code M_x,shaft/B + m_B g R_cog}.
   */
  public static double bladeShutdown_Nm(
      double shaftTorque_Nm,
      double bladesCoefficient,
      double blade_kg,
      double gravity_mps2,
      double cogRadius_m) {
    return shaftTorque_Nm / bladesCoefficient + blade_kg * gravity_mps2 * cogRadius_m;
  }

  /**
   * Case H, rotor stopped in the extreme wind: moment at the blade root out of the rotor plane
   * (N·m): {@code C_d 1/4 ρ V_e50² A_B R}, drag over the whole blade.
   *
   * @param dragCoefficient {@link IecRotorLoads#PARKED_CD}
   * @param blade_m2 area of one blade seen flat
   */
  public static double bladeParked_Nm(
      double dragCoefficient,
      double density_kgpm3,
      double gust50_mps,
      double blade_m2,
      double radius_m) {
    return dragCoefficient / 4 * density_kgpm3 * gust50_mps * gust50_mps * blade_m2 * radius_m;
  }

  /**
   * Case H, rotor spinning in the extreme wind, one blade at its greatest lift: {@code C_l,max 1/6
   * ρ V_e50² A_B R} (N·m).
   *
   * @param maximumLiftCoefficient {@link IecYawLoads#MAXIMUM_CL} when none is known
   */
  public static double bladeSpinning_Nm(
      double maximumLiftCoefficient,
      double density_kgpm3,
      double gust50_mps,
      double blade_m2,
      double radius_m) {
    return maximumLiftCoefficient
        / 6
        * density_kgpm3
        * gust50_mps
        * gust50_mps
        * blade_m2
        * radius_m;
  }

  /**
   * Case J, raising a tilting tower: bending moment at the lifting point (N·m), with 2 for shocks:
   * {@code 2 (m_towertop + m_overhang/2) g L_lt}.
   *
   * @param top_kg nacelle and rotor
   * @param overhang_kg tower between the lifting point and its top
   * @param liftToTop_m from the lifting point to the tower top
   */
  public static double towerHandling_Nm(
      double top_kg, double overhang_kg, double gravity_mps2, double liftToTop_m) {
    return 2 * (top_kg + overhang_kg / 2) * gravity_mps2 * liftToTop_m;
  }
}
