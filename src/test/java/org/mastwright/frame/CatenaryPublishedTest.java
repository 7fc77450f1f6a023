package org.mastwright.frame;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.mastwright.Source;

/** Cables against closed forms and handbook values. */
class CatenaryPublishedTest {
  private static final double AREA = 22.7005e-6;
  private static final double EA = 165.5e9 * AREA;
  private static final double WEIGHT = 1.76586;
  private static final List<ChainLoad.Components> OWN =
      List.of(new ChainLoad.Components(0, 0, -WEIGHT));
  private static final Chain.Point GUY = new Chain.Point(24, 0, 24);

  @Test
  @Source(key = "catenary, closed form", locator = "value 7.4", status = "recomputed")
  void value7_4_levelCatenary() {
    List<ChainLoad.Components> load = List.of(new ChainLoad.Components(0, 0, -10));
    Catenary c = Catenary.between(new Chain.Point(100, 0, 0), 1e15, 100.166750, load);
    assertEquals(2.502084, c.sag_m(), 3e-5);
    assertEquals(5025.021, c.upperTension_N(), 0.1);
    assertEquals(5000, c.lower()[0], 0.1);
    double exact = 2 * 5000 / 10.0 * Math.sinh(10 * 100 / (2 * 5000.0));
    Catenary sharp = Catenary.between(new Chain.Point(100, 0, 0), 1e16, exact, load);
    assertEquals(100.166750, exact, 5e-7);
    assertEquals(2.502084, sharp.sag_m(), 5e-7);
    assertEquals(5025.021, sharp.upperTension_N(), 5e-4);
  }

  private static double unstretched() {
    return Catenary.unstretchedForTension_m(GUY, EA, 2958.07, true, OWN);
  }

  @Test
  @Source(key = "elastic catenary, closed form", locator = "value 7.5", status = "recomputed")
  void value7_5_guyAtTenPercent() {
    Catenary c = Catenary.between(GUY, EA, unstretched(), OWN);
    assertEquals(33.914518, unstretched(), 5e-7);
    assertEquals(2106.55, c.upper()[0], 5e-3);
    assertEquals(2136.57, c.upper()[2], 5e-3);
    // the list's own H and V, with their last digits free, give 3000.407 to 3000.421
    assertEquals(3000.41, c.upperTension_N(), 1e-2);
    assertEquals(54281, c.stiffness()[0], 1e-4 * 54281);
  }

  @Test
  @Source(key = "elastic catenary, closed form", locator = "value 7.6", status = "recomputed")
  void value7_6_topMoved() {
    double[] moved = {0.05, 0.1, 0.2, -0.05};
    double[] expected = {4864.3, 7646.4, 13240.0, 314.5};
    for (int i = 0; i < moved.length; i++) {
      Catenary c = Catenary.between(new Chain.Point(24 + moved[i], 0, 24), EA, unstretched(), OWN);
      assertEquals(expected[i], c.upper()[0], 0.05);
    }
  }

  /**
   * Modulus that a level cable seems to have: stiffness along its chord, per area, times length.
   */
  private static double seemingModulus_Pa(double span_m, double stress_Pa) {
    double area = 1e-4;
    double axial = 165e9 * area;
    double weight = 83e3 * area;
    List<ChainLoad.Components> own = List.of(new ChainLoad.Components(0, 0, -weight));
    Chain.Point span = new Chain.Point(span_m, 0, 0);
    double length = span_m;
    for (int i = 0; i < 20; i++) {
      double tension = Math.hypot(stress_Pa * area, weight * length / 2);
      length = Catenary.unstretchedForTension_m(span, axial, tension, true, own);
    }
    Catenary c = Catenary.between(span, axial, length, own);
    assertEquals(stress_Pa, c.levelPull_N() / area, 1e-8 * stress_Pa);
    return c.stiffness()[0] * span_m / area;
  }

  /**
   * Ernst's modulus takes the cable for a parabola and leaves out its stretch; the elastic catenary
   * is stiffer by the stretch s/E and at most an eighth of (γl/s)²: here by 0.07 to 0.4 %.
   */
  @Test
  @Source(
      key = "EN 1993-1-11",
      locator = "5.4.2, value 7.7",
      status = "formula recalled, recomputed")
  void value7_7_ernstModulus() {
    double[] span = {30, 100, 200};
    double[][] stressThenModuli = {
      {100e6, 152.039e9, 84.735e9, 34.454e9},
      {200e6, 163.260e9, 147.532e9, 111.969e9},
      {400e6, 164.781e9, 162.594e9, 155.778e9}
    };
    for (double[] row : stressThenModuli) {
      for (int i = 0; i < span.length; i++) {
        double stretch = row[0] / 165e9;
        double sag = 83e3 * span[i] / row[0];
        double stiffer = seemingModulus_Pa(span[i], row[0]) / row[i + 1] - 1;
        assertTrue(stiffer > stretch - 1e-5, "stiffer by " + stiffer);
        assertTrue(stiffer < stretch + sag * sag / 8 + 1e-5, "stiffer by " + stiffer);
      }
    }
  }

  @Test
  @Source(key = "taut string, closed form", locator = "value 7.11", status = "recomputed")
  void value7_11_tautString() {
    double[] expected = {1.8848, 3.7696, 5.6545};
    for (int n = 1; n <= 3; n++) {
      assertEquals(expected[n - 1], Catenary.tautStringFrequency_Hz(n, 34, 2958, 0.18007), 1e-4);
    }
    assertEquals(5.3056, Catenary.pulseTime_s(10, 34, 2958, 0.18007), 5e-5);
  }

  @Test
  @Source(key = "Irvine, sagging cable", locator = "value 7.12", status = "recalled, recomputed")
  void value7_12_symmetricMode() {
    double[] irvine = {0.1, 1, 4 * Math.PI * Math.PI, 100, 1e6};
    double[] expected = {1.00410, 1.04020, 2.0000, 2.59718, 2.86058};
    for (int i = 0; i < irvine.length; i++) {
      assertEquals(expected[i], Catenary.symmetricModeFactor(irvine[i]), 1e-5);
    }
  }

  @Test
  @Source(key = "Hooke's law, rigid ends", locator = "value 7.8", status = "recomputed")
  void value7_8_thermalSlope() {
    double lbf = 4.4482216152605;
    double[] area_in2 = {0.02117, 0.03519, 0.05946};
    double[] expected = {3.30, 5.49, 9.28};
    double inch2 = 0.0254 * 0.0254;
    double modulus = 24e6 * lbf / inch2;
    for (int i = 0; i < 3; i++) {
      double ea = modulus * area_in2[i] * inch2;
      double warm = barTension(ea, 1);
      double cold = barTension(ea, 1 - 6.5e-6);
      assertEquals(expected[i], (cold - warm) / lbf, 5e-3);
    }
  }

  private static double barTension(double ea, double stretchFactor) {
    return Catenary.between(
            new Chain.Point(30, 0, 0),
            ea,
            29.99 * stretchFactor,
            List.of(new ChainLoad.Components(0, 0, 0)))
        .upperTension_N();
  }
}
