package org.mastwright.wind;

import java.util.List;
import org.mastwright.units.Unit;
import org.mastwright.working.Clause;
import org.mastwright.working.Formula;
import org.mastwright.working.Formula.Var;
import org.mastwright.working.Status;

/**
 * Wind of IEC 61400-2 and the conversions that lead to it. Speeds in m/s; every method is one
 * formula of its clause.
 */
public final class IecWind {
  private static final String IEC = "IEC 61400-2";

  /** 50-year gust profile, {@code Ve50(z) = 1.4 Vref (z/zhub)^0.11}. */
  public static final Formula GUST_AT =
      new Formula(
          "V_e50(z)",
          Unit.MPS,
          "1.4·{V_ref}·({z}/{z_hub})^0.11",
          new Clause(IEC, "2013", "6.3.3.2", Status.RECALLED),
          List.of(new Var("V_ref", Unit.MPS), new Var("z", Unit.M), new Var("z_hub", Unit.M)),
          v -> gustAt_mps(v[0], v[1], v[2]));

  public static final Formula REFERENCE_FROM_GUST =
      new Formula(
          "V_ref",
          Unit.MPS,
          "{V_e50}/1.4",
          new Clause(IEC, "2013", "6.3.3.2", Status.RECALLED),
          List.of(new Var("V_e50", Unit.MPS)),
          v -> v[0] / 1.4);

  public static final Formula ONE_YEAR_GUST =
      new Formula(
          "V_e1",
          Unit.MPS,
          "0.75·{V_e50}",
          new Clause(IEC, "2013", "6.3.3.2", Status.RECALLED),
          List.of(new Var("V_e50", Unit.MPS)),
          v -> 0.75 * v[0]);

  public static final Formula MEAN =
      new Formula(
          "V_ave",
          Unit.MPS,
          "max(0.2·{V_ref}, {V_site})",
          new Clause(IEC, "2013", "Table 1", Status.RECALLED),
          List.of(new Var("V_ref", Unit.MPS), new Var("V_site", Unit.MPS)),
          v -> mean_mps(v[0], v[1]));

  /** Return period, from the commentary of ASCE 7; {@code T} in years. */
  public static final Formula TO_FIFTY_YEARS =
      new Formula(
          "V_50",
          Unit.MPS,
          "{V_T}/(0.36 + 0.1·ln(12·{T}))",
          new Clause("ASCE 7", "2016", "commentary C26.5", Status.READ),
          List.of(new Var("V_T", Unit.MPS), new Var("T", Unit.ONE)),
          v -> fiftyYear_mps(v[0], v[1]));

  /** The same by EN 1991-1-4, shape 0.2, exponent 0.5. */
  public static final Formula TO_FIFTY_YEARS_EN =
      new Formula(
          "V_50",
          Unit.MPS,
          "{V_T}/√((1 − 0.2·ln(−ln(1 − 1/{T})))/(1 − 0.2·ln(−ln(0.98))))",
          new Clause("EN 1991-1-4", "2005", "4.2 note 4", Status.READ),
          List.of(new Var("V_T", Unit.MPS), new Var("T", Unit.ONE)),
          v -> fiftyYearEn_mps(v[0], v[1]));

  /** Ratio of a mean over {@code t} to the hourly mean: a fit to the Durst curve. */
  public static final Formula DURST =
      new Formula(
          "r(t)",
          Unit.ONE,
          "0.977 + 0.64/(1 + ({t}/38.14)^0.685)",
          new Clause("ASCE 7", "2005", "fit to Figure C6-4 (Durst)", Status.READ),
          List.of(new Var("t", Unit.S)),
          v -> durstRatio(v[0]));

  public static final Formula AVERAGING =
      new Formula(
          "V_3s",
          Unit.MPS,
          "{V_t}·{r_3}/{r_t}",
          new Clause("ASCE 7", "2005", "fit to Figure C6-4 (Durst)", Status.READ),
          List.of(new Var("V_t", Unit.MPS), new Var("r_3", Unit.ONE), new Var("r_t", Unit.ONE)),
          v -> v[0] * v[1] / v[2]);

  public static final Formula TO_HUB =
      new Formula(
          "V_hub",
          Unit.MPS,
          "{V}·({z_hub}/{z})^{α}",
          new Clause(IEC, "2013", "6.3.2.2, 6.3.3.2", Status.RECALLED),
          List.of(
              new Var("V", Unit.MPS),
              new Var("z_hub", Unit.M),
              new Var("z", Unit.M),
              new Var("α", Unit.ONE)),
          v -> toHeight_mps(v[0], v[1], v[2], v[3]));

  public static final Formula PRESSURE =
      new Formula(
          "q",
          Unit.PA,
          "0.5·{ρ}·{V}²",
          new Clause("Bernoulli", "-", "dynamic pressure", Status.PRACTICE),
          List.of(new Var("ρ", Unit.KGPM3), new Var("V", Unit.MPS)),
          v -> pressure_Pa(v[0], v[1]));

  /** Pressure and temperature of the standard atmosphere in the gas law. */
  public static final Formula DENSITY =
      new Formula(
          "ρ",
          Unit.KGPM3,
          "101325·(1 − 2.25577·10^(−5)·{h})^5.25588/(287.05·(288.15 − 0.0065·{h}))",
          new Clause("ISO 2533", "1975", "standard atmosphere", Status.RECALLED),
          List.of(new Var("h", Unit.M)),
          v -> density_kgpm3(v[0]));

  private IecWind() {}

  /** Valid up to 11 km. */
  public static double density_kgpm3(double altitude_m) {
    return 101325
        * Math.pow(1 - 2.25577e-5 * altitude_m, 5.25588)
        / (287.05 * (288.15 - 0.0065 * altitude_m));
  }

  public static double pressure_Pa(double density_kgpm3, double speed_mps) {
    return 0.5 * density_kgpm3 * speed_mps * speed_mps;
  }

  public static double gustAt_mps(double reference_mps, double height_m, double hub_m) {
    return 1.4 * reference_mps * Math.pow(height_m / hub_m, 0.11);
  }

  public static double mean_mps(double reference_mps, double siteMean_mps) {
    return Math.max(0.2 * reference_mps, siteMean_mps);
  }

  /** Valid from about 5 to 3000 years. */
  public static double fiftyYear_mps(double speed_mps, double returnPeriodCoefficient) {
    return speed_mps / (0.36 + 0.1 * Math.log(12 * returnPeriodCoefficient));
  }

  /** Valid above one year. */
  public static double fiftyYearEn_mps(double speed_mps, double returnPeriodCoefficient) {
    double period = 1 - 0.2 * Math.log(-Math.log(1 - 1 / returnPeriodCoefficient));
    double fifty = 1 - 0.2 * Math.log(-Math.log(0.98));
    return speed_mps / Math.sqrt(period / fifty);
  }

  /** Valid from 1 s to 1 h. */
  public static double durstRatio(double time_s) {
    return 0.977 + 0.64 / (1 + Math.pow(time_s / 38.14, 0.685));
  }

  public static double toHeight_mps(
      double speed_mps, double to_m, double from_m, double exponentCoefficient) {
    return speed_mps * Math.pow(to_m / from_m, exponentCoefficient);
  }

  /** Standard deviation of the normal turbulence model: {@code I15 (15 + a V)/(a + 1)}. */
  public static double turbulence_mps(
      double speed_mps, double i15Coefficient, double slopeCoefficient) {
    return i15Coefficient * (15 + slopeCoefficient * speed_mps) / (slopeCoefficient + 1);
  }
}
