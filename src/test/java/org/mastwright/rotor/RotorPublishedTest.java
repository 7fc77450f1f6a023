package org.mastwright.rotor;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.mastwright.Source;

/** Momentum theory and the simplified model against published numbers. */
class RotorPublishedTest {
  @Test
  @Source(key = "momentum theory (Betz)", locator = "value 1.1", status = "recalled, recomputed")
  void value1_1_optimum() {
    assertEquals(0.888888888, ActuatorDisc.ct(1.0 / 3), 1e-9);
    assertEquals(0.592592592, ActuatorDisc.cp(1.0 / 3), 1e-9);
    assertEquals(1.0 / 3, ActuatorDisc.inductionForCp(16.0 / 27), 1e-6);
  }

  @Test
  @Source(key = "momentum theory", locator = "value 1.2", status = "recomputed")
  void value1_2_inductions() {
    double[] a = {0.1, 0.2, 0.25, 0.4};
    double[] ct = {0.36, 0.64, 0.75, 0.96};
    double[] cp = {0.324, 0.512, 0.5625, 0.576};
    for (int i = 0; i < a.length; i++) {
      assertEquals(ct[i], ActuatorDisc.ct(a[i]), 1e-9);
      assertEquals(cp[i], ActuatorDisc.cp(a[i]), 1e-9);
    }
  }

  @Test
  @Source(key = "NREL/TP-500-36834 (2005)", locator = "values 1.3, 1.4", status = "read")
  void value1_3_highInduction() {
    double[] a = {0.4, 0.5, 0.6, 0.8, 1.0};
    double[] whole = {0.9600, 1.0556, 1.1822, 1.5289, 2.0000};
    double[] lossy = {0.8640, 0.9556, 1.0862, 1.4649, 2.0000};
    for (int i = 0; i < a.length; i++) {
      assertEquals(whole[i], ActuatorDisc.buhlCt(a[i], 1), 5e-5);
      assertEquals(lossy[i], ActuatorDisc.buhlCt(a[i], 0.9), 5e-5);
    }
  }

  @Test
  @Source(key = "NREL/TP-500-36834 (2005)", locator = "value 1.5", status = "read")
  void value1_5_inverse() {
    assertEquals(0.44590, ActuatorDisc.buhlInduction(1.0, 1), 5e-6);
    assertEquals(0.61233, ActuatorDisc.buhlInduction(1.2, 1), 5e-6);
    assertEquals(0.78571, ActuatorDisc.buhlInduction(1.5, 1), 5e-6);
    assertEquals(0.53752, ActuatorDisc.buhlInduction(1.0, 0.9), 5e-6);
  }
}
