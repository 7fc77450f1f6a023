package org.mastwright.checks.member;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.mastwright.Source;
import org.mastwright.design.Section;

/** Sections and resistances against published tables and examples. */
class TubePublishedTest {
  private static final double KSI = 6894757.293168361;
  private static final double INCH = 0.0254;

  private static void chs(double d, double t, double[] row) {
    Section s = new Section(d / 1000, t / 1000, 0);
    double[] found = {
      s.area_m2() * 7850,
      s.area_m2() * 1e4,
      s.secondMoment_m4() * 1e8,
      s.elasticModulus_m3() * 1e6,
      s.plasticModulus_m3() * 1e6
    };
    for (int i = 0; i < row.length; i++) {
      assertEquals(row[i], found[i], 0.006 * row[i]);
    }
  }

  @Test
  @Source(key = "EN 10210-2", locator = "section table, values 6.1 to 6.4", status = "read")
  void value6_1_hollowSections() {
    chs(114.3, 5, new double[] {13.5, 17.2, 257, 45.0, 59.8});
    chs(168.3, 6.3, new double[] {25.2, 32.1, 1050, 125, 165});
    chs(219.1, 8, new double[] {41.6, 53.1, 2960, 270, 357});
    chs(323.9, 10, new double[] {77.4, 98.6, 12200, 751, 986});
  }

  @Test
  @Source(key = "AISC manual", locator = "Pipe 6 STD, value 6.5", status = "read")
  void value6_5_pipe() {
    Section s = new Section(6.625 * INCH, 0.261 * INCH, 0);
    assertEquals(5.20, s.area_m2() / INCH / INCH, 0.01 * 5.20);
    assertEquals(26.5, s.secondMoment_m4() / Math.pow(INCH, 4), 0.01 * 26.5);
    assertEquals(7.99, s.elasticModulus_m3() / Math.pow(INCH, 3), 0.01 * 7.99);
    assertEquals(10.6, s.plasticModulus_m3() / Math.pow(INCH, 3), 0.01 * 10.6);
  }

  @Test
  @Source(key = "EN 1993-1-1", locator = "Table 5.2 sheet 3, value 6.7", status = "read")
  void value6_7_classLimits() {
    double[] limits = {33.10, 46.34, 59.58};
    for (int kind = 1; kind <= 3; kind++) {
      double below = limits[kind - 1] - 0.01;
      double above = limits[kind - 1] + 0.01;
      assertEquals(kind, EnTube.sectionClass(new Section(below * 0.001, 0.001, 0), 355e6));
      assertEquals(kind + 1, EnTube.sectionClass(new Section(above * 0.001, 0.001, 0), 355e6));
    }
  }

  @Test
  @Source(key = "EN 1993-1-1", locator = "6.3.1.2, value 6.8", status = "read, recomputed")
  void value6_8_bucklingCurves() {
    double[] slenderness = {0.3, 0.5, 0.8, 1.0, 1.5, 2.0, 3.0};
    double[] factors = {0.21, 0.34, 0.49, 0.76};
    double[][] chi = {
      {.9775, .9243, .7957, .6656, .3724, .2229, .1036},
      {.9641, .8842, .7245, .5970, .3422, .2095, .0994},
      {.9491, .8430, .6622, .5399, .3145, .1962, .0951},
      {.9235, .7793, .5797, .4671, .2766, .1766, .0882}
    };
    for (int c = 0; c < 4; c++) {
      for (int i = 0; i < slenderness.length; i++) {
        assertEquals(chi[c][i], EnTube.chi(slenderness[i], factors[c]), 6e-5);
      }
    }
  }

  @Test
  @Source(key = "EN 1993-1-1", locator = "6.2.9.1(5), value 6.13", status = "recomputed")
  void value6_13_plasticInteraction() {
    double[] n = {0.2, 0.5, 0.9};
    double[] left = {.9511, .7071, .1564};
    for (int i = 0; i < 3; i++) {
      assertEquals(1 / left[i], EnTube.plasticSum(1, 1, n[i], 1), 1e-3 / left[i]);
    }
  }

  @Test
  @Source(key = "AISC Design Examples v16", locator = "F.9B, value 6.16", status = "read")
  void value6_16_pipeBending() {
    double z = 31.0 * Math.pow(INCH, 3);
    double kipFt = 1355.8179483314;
    assertEquals(81.4, AiscTube.YIELD_MOMENT.evaluate(0.9, 35 * KSI, z) / kipFt, 0.002 * 81.4);
  }

  @Test
  @Source(key = "AISC 360", locator = "E3-2, value 6.18", status = "recomputed")
  void value6_18_pipeCompression() {
    double fe = AiscTube.euler_Pa(29000 * KSI, 240 * INCH, 2.25 * INCH);
    assertEquals(25.156, fe / KSI, 0.002 * 25.156);
    double fcr = AiscTube.critical_Pa(35 * KSI, fe);
    assertEquals(19.551, fcr / KSI, 0.002 * 19.551);
    double kip = 4448.2216152605;
    double area = 5.20 * INCH * INCH;
    assertEquals(91.5, AiscTube.COMPRESSION.evaluate(0.9, fcr, area) / kip, 0.002 * 91.5);
  }

  @Test
  @Source(key = "a squashed section", locator = "limit case", status = "practice")
  void squashedSectionNeverPasses() {
    assertEquals(true, EnTube.plasticSum(0, 1, 1.0001, 1) > 1);
  }
}
