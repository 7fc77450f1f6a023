package org.mastwright.wind;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.mastwright.Source;

/** Wind conversions against published numbers. */
class WindPublishedTest {
  @Test
  @Source(key = "IEC 61400-2:2006", locator = "6.3.3.1, value 3.4", status = "recalled")
  void value3_4_turbulence() {
    assertEquals(2.1, IecWind.turbulence_mps(10, 0.18, 2), 1e-9);
    assertEquals(2.7, IecWind.turbulence_mps(15, 0.18, 2), 1e-9);
    assertEquals(3.9, IecWind.turbulence_mps(25, 0.18, 2), 1e-9);
  }

  @Test
  @Source(key = "IEC 61400-2:2006", locator = "6.3.3.2, value 3.5", status = "recalled")
  void value3_5_gustProfile() {
    assertEquals(55.775, IecWind.gustAt_mps(42.5, 10, 18), 5e-4);
    assertEquals(44.625, 0.75 * IecWind.gustAt_mps(42.5, 18, 18), 1e-9);
  }

  @Test
  @Source(key = "ASCE 7-05", locator = "Figure C6-4 fit, value 4.14", status = "read")
  void value4_14_durst() {
    double[] t = {3, 20, 60, 600};
    double[] ratio = {1.5216, 1.3666, 1.2477, 1.0612};
    for (int i = 0; i < t.length; i++) {
      assertEquals(ratio[i], IecWind.durstRatio(t[i]), 5e-5);
    }
  }

  @Test
  @Source(key = "ISO 2533", locator = "sea level", status = "recalled")
  void densityAtSeaLevel() {
    assertEquals(1.225, IecWind.density_kgpm3(0), 5e-4);
  }

  /** A 700-year speed is 1.26 times the 50-year one: 1.6 in pressure. */
  @Test
  @Source(key = "ASCE 7-16", locator = "C26.5", status = "read")
  void returnPeriod() {
    assertEquals(1, IecWind.fiftyYear_mps(1, 50), 5e-4);
    assertEquals(1.6, 1 / Math.pow(IecWind.fiftyYear_mps(1, 700), 2), 0.01);
  }

  @Test
  @Source(key = "EN 1991-1-4", locator = "4.2 note 4, value 4.5", status = "read, recomputed")
  void value4_5_returnPeriod() {
    double[] years = {10, 25, 50, 500};
    double[] factor = {.90248, .95968, 1, 1.12236};
    for (int i = 0; i < years.length; i++) {
      assertEquals(factor[i], 1 / IecWind.fiftyYearEn_mps(1, years[i]), 1e-5);
    }
  }

  /** The standard atmosphere's table: 1.1117 kg/m³ at 1000 m, 1.0066 at 2000 m. */
  @Test
  @Source(key = "ISO 2533", locator = "table of densities", status = "recalled")
  void densityByHeight() {
    assertEquals(1.1117, IecWind.density_kgpm3(1000), 1e-3);
    assertEquals(1.0066, IecWind.density_kgpm3(2000), 1e-3);
  }
}
