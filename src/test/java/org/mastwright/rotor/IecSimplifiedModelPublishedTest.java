package org.mastwright.rotor;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.mastwright.Source;
import org.mastwright.design.Rotor;

/**
 * The simplified model worked by hand for one rotor: class II, R 1.5 m, 3 blades, 1 kW, 400 rpm,
 * greatest 520 rpm. Formulas recalled, numbers recomputed: this tests the coding, not the standard.
 */
class IecSimplifiedModelPublishedTest {
  private static final double R = 1.5;
  private static final double B = 3;
  private static final double G = 9.81;
  private static final double RHO = 1.225;
  private static final double BLADE_AREA = 0.2025;
  private static final double BLADE_MASS = 2;
  private static final double COG = 0.6;
  private static final double INERTIA = 1.125;
  private static final double ROTOR_MASS = 12;
  private static final double BEARING_ARM = 0.25;
  private static final double YAW_ARM = 0.35;
  private static final double OMEGA = 400 * Math.PI / 30;
  private static final double OMEGA_MAX = 520 * Math.PI / 30;
  private static final double GUST = 1.4 * 42.5;
  private static final double MEAN = 8.5;

  private static void near(double expected, double found) {
    assertEquals(expected, found, 1e-3 * expected);
  }

  private static double torque() {
    return IecRotorLoads.torque_Nm(1000, IecRotorLoads.efficiency(1000), OMEGA);
  }

  private static double ratio() {
    return IecRotorLoads.tipSpeedRatio(OMEGA, R, IecFatigueLoads.designWind_mps(MEAN));
  }

  private static double thrustRange() {
    return IecFatigueLoads.shaftThrust_N(ratio(), torque(), R);
  }

  private static IecYawLoads.Overhung overhung() {
    return new IecYawLoads.Overhung(ROTOR_MASS, G, BEARING_ARM, R, thrustRange());
  }

  @Test
  @Source(key = "IEC 61400-2:2006", locator = "7.4.1, value 3.1", status = "recalled, recomputed")
  void value3_1_designValues() {
    near(0.605, IecRotorLoads.efficiency(1000));
    near(39.460, torque());
    near(5.2800, ratio());
  }

  @Test
  @Source(
      key = "IEC 61400-2:2006",
      locator = "7.4.2 case A, value 3.1",
      status = "recalled, recomputed")
  void value3_1_caseARanges() {
    near(4211.0, IecFatigueLoads.bladePull_N(BLADE_MASS, COG, OMEGA));
    near(36.70, IecFatigueLoads.bladeEdgewise_Nm(torque(), B, BLADE_MASS, G, COG));
    near(69.45, IecFatigueLoads.bladeFlapwise_Nm(ratio(), torque(), B));
    near(208.35, thrustRange());
    double eccentricity = IecFatigueLoads.eccentricity_m(R);
    near(41.23, IecFatigueLoads.shaftTorque_Nm(torque(), ROTOR_MASS, G, eccentricity));
    near(110.95, IecFatigueLoads.shaftBending_Nm(ROTOR_MASS, G, BEARING_ARM, R, thrustRange()));
  }

  @Test
  @Source(
      key = "IEC 61400-2:2006",
      locator = "7.4.3 case B, value 3.2",
      status = "recalled, recomputed")
  void value3_2_caseBYawing() {
    double yaw = IecYawLoads.yawRate_radps(R);
    near(2.9493, yaw);
    Rotor.Blade blade = new Rotor.Blade(BLADE_MASS, COG, INERTIA, true);
    near(316.3, IecYawLoads.bladeYawing_Nm(blade, yaw, YAW_ARM, OMEGA, R, thrustRange()));
    near(498.5, IecYawLoads.shaftYawing_Nm(B, yaw, OMEGA, INERTIA, overhung()));
  }

  /** By hand: 4 · 2.9493 · 41.888 · 1.125 = 555.9, weight 29.43, thrust off centre 52.09. */
  @Test
  @Source(
      key = "IEC 61400-2:2006",
      locator = "7.4.3 case B, two blades",
      status = "recalled, by hand")
  void value3_2_caseBTwoBlades() {
    double yaw = IecYawLoads.yawRate_radps(R);
    near(637.4, IecYawLoads.shaftYawingTwoBlades_Nm(yaw, OMEGA, INERTIA, overhung()));
  }

  @Test
  void yawRateKeepsToItsRange() {
    double twoSquareMetres = Math.sqrt(2 / Math.PI);
    assertEquals(3, IecYawLoads.yawRate_radps(0), 0);
    assertEquals(3, IecYawLoads.yawRate_radps(twoSquareMetres), 1e-12);
    assertEquals(2.99, IecYawLoads.yawRate_radps(Math.sqrt(3 / Math.PI)), 1e-12);
    double scope = Math.sqrt(200 / Math.PI);
    assertEquals(1.02, IecYawLoads.yawRate_radps(scope * (1 - 1e-12)), 1e-9);
    assertThrows(IllegalArgumentException.class, () -> IecYawLoads.yawRate_radps(scope * 1.001));
    assertThrows(IllegalArgumentException.class, () -> IecYawLoads.yawRate_radps(Double.NaN));
  }

  @Test
  void twoBladesHaveTheirOwnFormula() {
    assertThrows(
        IllegalArgumentException.class,
        () -> IecYawLoads.shaftYawing_Nm(2, 3, OMEGA, INERTIA, overhung()));
    assertThrows(
        IllegalArgumentException.class,
        () -> IecYawLoads.shaftYawing_Nm(Double.NaN, 3, OMEGA, INERTIA, overhung()));
  }

  @Test
  @Source(
      key = "IEC 61400-2:2006",
      locator = "7.4.4 case C, value 3.2",
      status = "recalled, recomputed")
  void value3_2_caseCYawError() {
    near(
        473.2,
        IecYawLoads.bladeYawError_Nm(RHO, BLADE_AREA, IecYawLoads.MAXIMUM_CL, R, OMEGA, ratio()));
  }

  @Test
  @Source(
      key = "IEC 61400-2:2006",
      locator = "7.4.5 case D, value 3.2",
      status = "recalled, recomputed")
  void value3_2_caseDThrust() {
    near(977.5, IecRotorLoads.caseD_N(IecRotorLoads.MAXIMUM_THRUST_CT, RHO, MEAN, R));
  }

  @Test
  @Source(
      key = "IEC 61400-2:2006",
      locator = "7.4.6 case E, value 3.2",
      status = "recalled, recomputed")
  void value3_2_caseEOverspeed() {
    near(3558.3, IecBladeAndShaftLoads.bladeOverspeed_N(BLADE_MASS, OMEGA_MAX, COG));
    double eccentricity = IecFatigueLoads.eccentricity_m(R);
    near(
        96.15,
        IecBladeAndShaftLoads.shaftOverspeed_Nm(
            ROTOR_MASS, G, BEARING_ARM, eccentricity, OMEGA_MAX));
  }

  /** The blade's third of 78.92 N·m by hand. */
  @Test
  @Source(
      key = "IEC 61400-2:2006",
      locator = "7.4.7 case F, value 3.2",
      status = "recalled, recomputed")
  void value3_2_caseFShortCircuit() {
    double shaft =
        IecBladeAndShaftLoads.shaftShortCircuit_Nm(
            IecBladeAndShaftLoads.SHORT_CIRCUIT_FACTOR, torque());
    near(78.92, shaft);
    near(26.307, IecBladeAndShaftLoads.bladeShortCircuit_Nm(shaft, B));
  }

  /** By hand for a brake of 60 N·m: 60 + 39.46 = 99.46; 99.46/3 + 2 · 9.81 · 0.6 = 44.925. */
  @Test
  @Source(key = "IEC 61400-2:2006", locator = "7.4.8 case G", status = "recalled, by hand")
  void caseGShutdown() {
    double shaft = IecBladeAndShaftLoads.shaftShutdown_Nm(60, torque());
    near(99.46, shaft);
    near(44.925, IecBladeAndShaftLoads.bladeShutdown_Nm(shaft, B, BLADE_MASS, G, COG));
  }

  @Test
  @Source(
      key = "IEC 61400-2:2006",
      locator = "7.4.9 case H, value 3.3",
      status = "recalled, recomputed")
  void value3_3_caseHParked() {
    double cd = IecRotorLoads.PARKED_CD;
    near(494.0, IecBladeAndShaftLoads.bladeParked_Nm(cd, RHO, GUST, BLADE_AREA, R));
    near(1976.0, IecRotorLoads.parked_N(B, cd, RHO, GUST, BLADE_AREA));
  }

  @Test
  @Source(
      key = "IEC 61400-2:2006",
      locator = "7.4.9 case H, value 3.3",
      status = "recalled, recomputed")
  void value3_3_caseHSpinning() {
    double ratio = IecRotorLoads.tipSpeedRatio(OMEGA_MAX, R, GUST);
    near(1.3728, ratio);
    near(844.1, IecRotorLoads.spinning_N(B, BLADE_AREA, ratio, RHO, GUST));
    double cl = IecYawLoads.MAXIMUM_CL;
    near(439.1, IecBladeAndShaftLoads.bladeSpinning_Nm(cl, RHO, GUST, BLADE_AREA, R));
  }

  /** By hand: 80 kg on top, 100 kg over 6 m above the lifting point: 2 · 130 · 9.81 · 6 = 15304. */
  @Test
  @Source(key = "IEC 61400-2:2006", locator = "7.4.11 case J", status = "recalled, by hand")
  void caseJHandling() {
    near(15303.6, IecBladeAndShaftLoads.towerHandling_Nm(80, 100, G, 6));
  }
}
