package org.mastwright.units;

import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * A unit of measure: {@code SI value = (value + offset) · factor}.
 *
 * @param symbol as printed and as typed, such as {@code ft} or {@code kN·m}
 * @param dimension what it measures
 * @param factor SI units in one of this unit
 * @param offset added before scaling; zero but for degrees Celsius and Fahrenheit
 */
public record Unit(String symbol, Dimension dimension, double factor, double offset) {

  // dimensionless
  public static final Unit ONE = of("", Dimension.ONE, 1);
  public static final Unit PERCENT = of("%", Dimension.ONE, 0.01);

  // length
  public static final Unit M = of("m", Dimension.LENGTH, 1);
  public static final Unit MM = of("mm", Dimension.LENGTH, 1e-3);
  public static final Unit CM = of("cm", Dimension.LENGTH, 1e-2);
  public static final Unit KM = of("km", Dimension.LENGTH, 1e3);
  public static final Unit FT = of("ft", Dimension.LENGTH, 0.3048);
  public static final Unit IN = of("in", Dimension.LENGTH, 0.0254);
  public static final Unit YD = of("yd", Dimension.LENGTH, 0.9144);
  public static final Unit MILE = of("mi", Dimension.LENGTH, 1609.344);

  // area, volume, second moment of area
  public static final Unit M2 = of("m²", Dimension.AREA, 1);
  public static final Unit CM2 = of("cm²", Dimension.AREA, 1e-4);
  public static final Unit MM2 = of("mm²", Dimension.AREA, 1e-6);
  public static final Unit FT2 = of("ft²", Dimension.AREA, 0.3048 * 0.3048);
  public static final Unit IN2 = of("in²", Dimension.AREA, 0.0254 * 0.0254);
  public static final Unit M3 = of("m³", Dimension.VOLUME, 1);
  public static final Unit CM3 = of("cm³", Dimension.VOLUME, 1e-6);
  public static final Unit MM3 = of("mm³", Dimension.VOLUME, 1e-9);
  public static final Unit FT3 = of("ft³", Dimension.VOLUME, 0.3048 * 0.3048 * 0.3048);
  public static final Unit IN3 = of("in³", Dimension.VOLUME, 0.0254 * 0.0254 * 0.0254);
  public static final Unit M4 = of("m⁴", Dimension.SECOND_MOMENT, 1);
  public static final Unit CM4 = of("cm⁴", Dimension.SECOND_MOMENT, 1e-8);
  public static final Unit MM4 = of("mm⁴", Dimension.SECOND_MOMENT, 1e-12);
  public static final Unit IN4 = of("in⁴", Dimension.SECOND_MOMENT, 4.162314256e-7);

  // mass
  public static final Unit KG = of("kg", Dimension.MASS, 1);
  public static final Unit G_MASS = of("g", Dimension.MASS, 1e-3);
  public static final Unit TONNE = of("t", Dimension.MASS, 1e3);
  public static final Unit LB = of("lb", Dimension.MASS, 0.45359237);
  public static final Unit KGPM = of("kg/m", Dimension.MASS_PER_LENGTH, 1);
  public static final Unit LBPFT = of("lb/ft", Dimension.MASS_PER_LENGTH, 0.45359237 / 0.3048);
  public static final Unit KGPM3 = of("kg/m³", Dimension.DENSITY, 1);
  public static final Unit PCF = of("pcf", Dimension.DENSITY, 0.45359237 / 0.028316846592);
  public static final Unit KNPM3 = of("kN/m³", Dimension.WEIGHT_PER_VOLUME, 1e3);
  public static final Unit PCF_WEIGHT =
      of("pcf", Dimension.WEIGHT_PER_VOLUME, 4.4482216152605 / 0.028316846592);
  public static final Unit KGM2 = of("kg·m²", Dimension.MASS_INERTIA, 1);
  public static final Unit LBFT2 =
      of("lb·ft²", Dimension.MASS_INERTIA, 0.45359237 * 0.3048 * 0.3048);

  // force
  public static final Unit N = of("N", Dimension.FORCE, 1);
  public static final Unit KN = of("kN", Dimension.FORCE, 1e3);
  public static final Unit MN = of("MN", Dimension.FORCE, 1e6);
  public static final Unit KGF = of("kgf", Dimension.FORCE, 9.80665);
  public static final Unit LBF = of("lbf", Dimension.FORCE, 4.4482216152605);
  public static final Unit KIP = of("kip", Dimension.FORCE, 4448.2216152605);
  public static final Unit NPM = of("N/m", Dimension.FORCE_PER_LENGTH, 1);
  public static final Unit KNPM = of("kN/m", Dimension.FORCE_PER_LENGTH, 1e3);
  public static final Unit LBFPFT =
      of("lbf/ft", Dimension.FORCE_PER_LENGTH, 4.4482216152605 / 0.3048);
  public static final Unit NM = of("N·m", Dimension.MOMENT, 1);
  public static final Unit KNM = of("kN·m", Dimension.MOMENT, 1e3);
  public static final Unit LBFFT = of("lbf·ft", Dimension.MOMENT, 4.4482216152605 * 0.3048);
  public static final Unit KIPFT = of("kip·ft", Dimension.MOMENT, 4448.2216152605 * 0.3048);
  public static final Unit KIPIN = of("kip·in", Dimension.MOMENT, 4448.2216152605 * 0.0254);

  // pressure and stress
  public static final Unit PA = of("Pa", Dimension.PRESSURE, 1);
  public static final Unit KPA = of("kPa", Dimension.PRESSURE, 1e3);
  public static final Unit MPA = of("MPa", Dimension.PRESSURE, 1e6);
  public static final Unit GPA = of("GPa", Dimension.PRESSURE, 1e9);
  public static final Unit PSI = of("psi", Dimension.PRESSURE, 4.4482216152605 / 0.00064516);
  public static final Unit KSI = of("ksi", Dimension.PRESSURE, 4448.2216152605 / 0.00064516);
  public static final Unit PSF = of("psf", Dimension.PRESSURE, 4.4482216152605 / 0.09290304);
  public static final Unit KPAPM = of("kPa/m", Dimension.PRESSURE_PER_LENGTH, 1e3);
  public static final Unit PSFPFT =
      of("psf/ft", Dimension.PRESSURE_PER_LENGTH, 4.4482216152605 / 0.09290304 / 0.3048);

  // stiffness
  public static final Unit STIFFNESS_NPM = of("N/m", Dimension.STIFFNESS, 1);
  public static final Unit STIFFNESS_KNPM = of("kN/m", Dimension.STIFFNESS, 1e3);
  public static final Unit STIFFNESS_LBFPIN =
      of("lbf/in", Dimension.STIFFNESS, 4.4482216152605 / 0.0254);
  public static final Unit NMPRAD = of("N·m/rad", Dimension.ROTATIONAL_STIFFNESS, 1);
  public static final Unit KNMPRAD = of("kN·m/rad", Dimension.ROTATIONAL_STIFFNESS, 1e3);
  public static final Unit MNMPRAD = of("MN·m/rad", Dimension.ROTATIONAL_STIFFNESS, 1e6);
  public static final Unit KIPFTPRAD =
      of("kip·ft/rad", Dimension.ROTATIONAL_STIFFNESS, 4448.2216152605 * 0.3048);
  public static final Unit NM2 = of("N·m²", Dimension.BENDING_STIFFNESS, 1);
  public static final Unit KNM2 = of("kN·m²", Dimension.BENDING_STIFFNESS, 1e3);
  public static final Unit KIPFT2 =
      of("kip·ft²", Dimension.BENDING_STIFFNESS, 4448.2216152605 * 0.3048 * 0.3048);

  // motion
  public static final Unit MPS = of("m/s", Dimension.SPEED, 1);
  public static final Unit KMPH = of("km/h", Dimension.SPEED, 1 / 3.6);
  public static final Unit MPH = of("mph", Dimension.SPEED, 0.44704);
  public static final Unit KNOT = of("kn", Dimension.SPEED, 1852.0 / 3600);
  public static final Unit FTPS = of("ft/s", Dimension.SPEED, 0.3048);
  public static final Unit MPS2 = of("m/s²", Dimension.ACCELERATION, 1);
  public static final Unit GEE = of("g", Dimension.ACCELERATION, 9.80665);
  public static final Unit RADPS = of("rad/s", Dimension.ROTATION_SPEED, 1);
  public static final Unit RPM = of("rpm", Dimension.ROTATION_SPEED, Math.PI / 30);
  public static final Unit HZ = of("Hz", Dimension.FREQUENCY, 1);
  public static final Unit RAD = of("rad", Dimension.ANGLE, 1);
  public static final Unit DEG = of("deg", Dimension.ANGLE, Math.PI / 180);
  public static final Unit S = of("s", Dimension.TIME, 1);
  public static final Unit MIN = of("min", Dimension.TIME, 60);
  public static final Unit HOUR = of("h", Dimension.TIME, 3600);
  public static final Unit DAY = of("d", Dimension.TIME, 86400);
  public static final Unit YR = of("yr", Dimension.TIME, 365.25 * 86400);

  // temperature and power
  public static final Unit DEGC = new Unit("degC", Dimension.TEMPERATURE, 1, 273.15);
  public static final Unit DEGF = new Unit("degF", Dimension.TEMPERATURE, 5.0 / 9, 459.67);
  public static final Unit K = of("K", Dimension.TEMPERATURE_CHANGE, 1);
  public static final Unit F_CHANGE = of("degF", Dimension.TEMPERATURE_CHANGE, 5.0 / 9);
  public static final Unit PERK = of("1/K", Dimension.THERMAL_EXPANSION, 1);
  public static final Unit PERDEGF = of("1/degF", Dimension.THERMAL_EXPANSION, 1.8);
  public static final Unit W = of("W", Dimension.POWER, 1);
  public static final Unit KW = of("kW", Dimension.POWER, 1e3);
  public static final Unit MW = of("MW", Dimension.POWER, 1e6);
  public static final Unit HP = of("hp", Dimension.POWER, 745.6998715822702);

  /** Pairs that print the same quantity at the same scale to a metric and an American reader. */
  private static final List<List<Unit>> COUNTERPARTS =
      List.of(
          List.of(M, FT),
          List.of(MM, IN),
          List.of(KM, MILE),
          List.of(M2, FT2),
          List.of(CM2, IN2),
          List.of(MM2, IN2),
          List.of(M3, FT3),
          List.of(CM3, IN3),
          List.of(MM3, IN3),
          List.of(CM4, IN4),
          List.of(MM4, IN4),
          List.of(KG, LB),
          List.of(KGPM, LBPFT),
          List.of(KGPM3, PCF),
          List.of(KNPM3, PCF_WEIGHT),
          List.of(KGM2, LBFT2),
          List.of(N, LBF),
          List.of(KN, KIP),
          List.of(NPM, LBFPFT),
          List.of(NM, LBFFT),
          List.of(KNM, KIPFT),
          List.of(PA, PSF),
          List.of(KPA, PSF),
          List.of(MPA, KSI),
          List.of(GPA, KSI),
          List.of(KPAPM, PSFPFT),
          List.of(STIFFNESS_NPM, STIFFNESS_LBFPIN),
          List.of(STIFFNESS_KNPM, STIFFNESS_LBFPIN),
          List.of(KNMPRAD, KIPFTPRAD),
          List.of(MNMPRAD, KIPFTPRAD),
          List.of(KNM2, KIPFT2),
          List.of(MPS, MPH),
          List.of(DEGC, DEGF),
          List.of(K, F_CHANGE),
          List.of(PERK, PERDEGF));

  public Unit {
    Objects.requireNonNull(symbol, "symbol");
    Objects.requireNonNull(dimension, "dimension");
    if (!(factor > 0) || !Double.isFinite(factor) || !Double.isFinite(offset)) {
      throw new IllegalArgumentException("unit " + symbol + ": factor " + factor);
    }
  }

  private static Unit of(String symbol, Dimension dimension, double factor) {
    return new Unit(symbol, dimension, factor, 0);
  }

  /** The SI value of {@code value} in this unit. */
  public double toSi(double value) {
    return (value + offset) * factor;
  }

  /** The value in this unit of an SI value. */
  public double fromSi(double si) {
    return si / factor - offset;
  }

  /** The unit an American reader expects where this one is printed; empty when they are one. */
  public Optional<Unit> american() {
    return COUNTERPARTS.stream().filter(p -> p.get(0).equals(this)).map(p -> p.get(1)).findFirst();
  }

  /** {@code 12.3 kN}: the SI value printed in this unit with the figures it deserves. */
  public String print(double si, int significantDigits) {
    String number = Numbers.significant(fromSi(si), significantDigits);
    if (symbol.isEmpty()) {
      return number;
    }
    return symbol.equals("%") ? number + " %" : number + " " + symbol;
  }

  /** Three significant digits, the report's default. */
  public String print(double si) {
    return print(si, 3);
  }
}
