package org.mastwright.units;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads a number with its unit: {@code 12.5 m}, {@code 5 ft 6 in}, {@code 2-1/2 in}. */
public final class Quantities {
  private static final String NUMBER =
      "[-+]?(?:\\d+[ -]\\d+/\\d+|\\d+/\\d+|\\d+\\.?\\d*(?:[eE][-+]?\\d+)?|\\.\\d+(?:[eE][-+]?\\d+)?)";
  private static final Pattern TERM =
      Pattern.compile("\\s*(" + NUMBER + ")\\s*([^\\s\\d][^\\s]*|1/K|1/degF)?\\s*");
  private static final Pattern COMMA = Pattern.compile("\\d,\\d");

  private static final Map<String, List<Unit>> UNITS = units();

  private Quantities() {}

  /** Why a text is no value of the dimension wanted. */
  public static final class Unreadable extends Exception {
    private static final long serialVersionUID = 1L;
    private final String id;

    Unreadable(String id, String message) {
      super(message);
      this.id = id;
    }

    /** E1 no unit, E3 comma, E6 another dimension, E7 mass for force, else {@code unit}. */
    public String id() {
      return id;
    }
  }

  private static void add(Map<String, List<Unit>> map, Unit unit, String... names) {
    for (String name : names) {
      map.merge(
          name,
          List.of(unit),
          (a, b) -> java.util.stream.Stream.concat(a.stream(), b.stream()).toList());
    }
  }

  private static Map<String, List<Unit>> units() {
    Map<String, List<Unit>> m = new LinkedHashMap<>();
    add(m, Unit.PERCENT, "%");
    add(m, Unit.M, "m");
    add(m, Unit.MM, "mm");
    add(m, Unit.CM, "cm");
    add(m, Unit.KM, "km");
    add(m, Unit.FT, "ft", "'");
    add(m, Unit.IN, "in", "\"");
    add(m, Unit.MILE, "mi");
    add(m, Unit.M2, "m^2", "m2");
    add(m, Unit.CM2, "cm^2", "cm2");
    add(m, Unit.MM2, "mm^2", "mm2");
    add(m, Unit.FT2, "ft^2", "ft2");
    add(m, Unit.IN2, "in^2", "in2");
    add(m, Unit.KG, "kg");
    add(m, Unit.G_MASS, "g");
    add(m, Unit.GEE, "g");
    add(m, Unit.TONNE, "t");
    add(m, Unit.LB, "lb", "lbs");
    add(m, Unit.LBF, "lb", "lbs", "lbf");
    add(m, Unit.KIP, "kip", "kips");
    add(m, Unit.KGPM, "kg/m");
    add(m, Unit.LBPFT, "lb/ft");
    add(m, Unit.KGPM3, "kg/m^3", "kg/m3");
    add(m, Unit.PCF, "pcf");
    add(m, Unit.KNPM3, "kN/m^3", "kN/m3");
    add(m, Unit.PCF_WEIGHT, "pcf");
    add(m, Unit.KGM2, "kg.m^2", "kg.m2");
    add(m, Unit.LBFT2, "lb.ft^2", "lb.ft2");
    add(m, Unit.N, "N");
    add(m, Unit.KN, "kN");
    add(m, Unit.MN, "MN");
    add(m, Unit.KGF, "kgf");
    add(m, Unit.NPM, "N/m");
    add(m, Unit.KNPM, "kN/m");
    add(m, Unit.LBFPFT, "lbf/ft", "lb/ft");
    add(m, Unit.NM, "N.m");
    add(m, Unit.KNM, "kN.m");
    add(m, Unit.LBFFT, "ft-lb", "lb-ft", "lbf.ft", "ft-lbf");
    add(m, Unit.KIPFT, "kip-ft", "kip.ft");
    add(m, Unit.PA, "Pa");
    add(m, Unit.KPA, "kPa");
    add(m, Unit.MPA, "MPa");
    add(m, Unit.GPA, "GPa");
    add(m, Unit.PSI, "psi");
    add(m, Unit.KSI, "ksi");
    add(m, Unit.PSF, "psf");
    add(m, Unit.KPAPM, "kPa/m");
    add(m, Unit.PSFPFT, "psf/ft");
    add(m, Unit.NMPRAD, "N.m/rad");
    add(m, Unit.KNMPRAD, "kN.m/rad");
    add(m, Unit.MNMPRAD, "MN.m/rad");
    add(m, Unit.KIPFTPRAD, "kip-ft/rad", "kip.ft/rad");
    add(m, Unit.MPS, "m/s");
    add(m, Unit.KMPH, "km/h");
    add(m, Unit.MPH, "mph");
    add(m, Unit.KNOT, "kn");
    add(m, Unit.FTPS, "ft/s");
    add(m, Unit.MPS2, "m/s^2", "m/s2");
    add(m, Unit.RADPS, "rad/s");
    add(m, Unit.RPM, "rpm");
    add(m, Unit.HZ, "Hz");
    add(m, Unit.RAD, "rad");
    add(m, Unit.DEG, "deg", "°");
    add(m, Unit.S, "s");
    add(m, Unit.MIN, "min");
    add(m, Unit.HOUR, "h");
    add(m, Unit.YR, "yr");
    add(m, Unit.DEGC, "degC", "°C");
    add(m, Unit.DEGF, "degF", "°F");
    add(m, Unit.K, "K");
    add(m, Unit.F_CHANGE, "degF");
    add(m, Unit.PERK, "1/K");
    add(m, Unit.PERDEGF, "1/degF");
    add(m, Unit.W, "W");
    add(m, Unit.KW, "kW");
    add(m, Unit.HP, "hp");
    return m;
  }

  /** Units a value of this dimension may be typed in. */
  public static String accepted(Dimension dimension) {
    StringBuilder out = new StringBuilder();
    UNITS.forEach(
        (name, units) -> {
          if (units.stream().anyMatch(u -> u.dimension() == dimension)) {
            out.append(out.isEmpty() ? "" : ", ").append(name);
          }
        });
    return out.toString();
  }

  /** The first unit a text names for the dimension; metres, newtons and the like otherwise. */
  public static Unit unitOf(String text, Dimension dimension) {
    Matcher term = TERM.matcher(text);
    while (term.find()) {
      for (Unit u : UNITS.getOrDefault(String.valueOf(term.group(2)), List.of())) {
        if (u.dimension() == dimension) {
          return u;
        }
      }
    }
    return usual(dimension).get(0);
  }

  /** Units to show as examples, the most usual first. */
  private static List<Unit> usual(Dimension dimension) {
    return switch (dimension) {
      case SPEED -> List.of(Unit.MPH, Unit.MPS, Unit.KMPH);
      case LENGTH -> List.of(Unit.M, Unit.FT, Unit.MM);
      case MASS -> List.of(Unit.KG, Unit.LB);
      case FORCE -> List.of(Unit.KN, Unit.LBF, Unit.KGF);
      case PRESSURE -> List.of(Unit.MPA, Unit.PSI, Unit.KPA);
      case ROTATION_SPEED -> List.of(Unit.RPM, Unit.RADPS);
      case ANGLE -> List.of(Unit.DEG);
      case POWER -> List.of(Unit.KW, Unit.HP);
      default -> {
        List<Unit> all = new ArrayList<>();
        UNITS
            .values()
            .forEach(
                units -> units.stream().filter(u -> u.dimension() == dimension).forEach(all::add));
        yield all.subList(0, Math.min(2, all.size()));
      }
    };
  }

  /** {@code 115 mph, 51.4 m/s or 185 km/h}: a bare number taken in the most usual unit. */
  private static String examples(String number, double size, Dimension dimension) {
    List<Unit> units = usual(dimension);
    List<String> all = new ArrayList<>();
    for (Unit u : units) {
      all.add(all.isEmpty() ? number + " " + u.symbol() : u.print(units.get(0).toSi(size)));
    }
    String last = all.remove(all.size() - 1);
    return all.isEmpty() ? last : String.join(", ", all) + " or " + last;
  }

  /** The SI value of a text such as {@code 5 ft 6 in}. */
  public static double read(String text, Dimension dimension) throws Unreadable {
    if (COMMA.matcher(text).find()) {
      throw new Unreadable(
          "E3",
          "\""
              + text
              + "\": a comma inside a number is not accepted, because 1,500 is one and a half to"
              + " some readers. Write "
              + text.replace(",", "")
              + ".");
    }
    Matcher term = TERM.matcher(text);
    double sum = 0;
    int at = 0;
    boolean some = false;
    while (at < text.length() && term.find(at) && term.start() == at) {
      sum += value(text, term.group(1), term.group(2), dimension, some);
      some = true;
      at = term.end();
    }
    if (!some || at < text.length()) {
      throw new Unreadable(
          "number",
          "\"" + text + "\" is not a number with a unit. Accepted: " + accepted(dimension) + ".");
    }
    return sum;
  }

  private static double value(
      String text, String number, String unitName, Dimension dimension, boolean later)
      throws Unreadable {
    double size = number(number);
    if (unitName == null || unitName.isEmpty()) {
      if (dimension == Dimension.ONE && !later) {
        return size;
      }
      throw new Unreadable(
          "E1", text + " has no unit. Write " + examples(number.trim(), size, dimension) + ".");
    }
    String name = unitName.replace("·", ".").replace("²", "^2").replace("³", "^3");
    if (name.toLowerCase(Locale.ROOT).startsWith("ton") && !name.equals("tonne")) {
      throw new Unreadable(
          "ton", "\"" + text + "\": tons differ by a tenth between countries. Write kg, lb or kN.");
    }
    List<Unit> units = UNITS.getOrDefault(name, List.of());
    for (Unit u : units) {
      if (u.dimension() == dimension) {
        return u.toSi(size);
      }
    }
    if (dimension == Dimension.FORCE && name.equals("kg")) {
      throw new Unreadable(
          "E7",
          text
              + " is a mass; a pull is needed. If the scale showed "
              + text
              + ", write "
              + number
              + " kgf ("
              + Unit.KN.print(size * 9.80665)
              + ").");
    }
    if (units.isEmpty()) {
      throw new Unreadable(
          "unit",
          "\"" + unitName + "\" is not a unit known here. Accepted: " + accepted(dimension) + ".");
    }
    throw new Unreadable(
        "E6",
        text
            + " is "
            + words(units.get(0).dimension())
            + "; here "
            + (dimension == Dimension.ROTATION_SPEED ? "the turning speed" : words(dimension))
            + " is meant, such as "
            + example(dimension)
            + ".");
  }

  private static String words(Dimension dimension) {
    return switch (dimension) {
      case ONE -> "a plain number";
      case SPEED -> "a wind speed";
      case ROTATION_SPEED -> "a turning speed";
      case LENGTH -> "a length";
      case ANGLE -> "an angle";
      case AREA -> "an area";
      case ACCELERATION -> "an acceleration";
      default -> "a " + dimension.name().toLowerCase(Locale.ROOT).replace('_', ' ');
    };
  }

  private static String example(Dimension dimension) {
    return switch (dimension) {
      case ONE -> "0.5 or 10 %";
      case ROTATION_SPEED -> "390 rpm";
      case SPEED -> "24 mph or 10.7 m/s";
      case LENGTH -> "12.5 m or 41 ft";
      case MASS -> "86 kg or 190 lb";
      case FORCE -> "9.5 kN or 350 kgf";
      case PRESSURE -> "235 MPa or 35 ksi";
      case ANGLE -> "4 deg";
      case POWER -> "1.8 kW";
      case TIME -> "12.4 s";
      case TEMPERATURE -> "15 degC";
      default -> "one in " + accepted(dimension);
    };
  }

  private static double number(String text) {
    String t = text.trim();
    int slash = t.indexOf('/');
    if (slash < 0) {
      return Double.parseDouble(t);
    }
    int gap = Math.max(t.lastIndexOf(' ', slash), t.lastIndexOf('-', slash));
    double whole = gap > 0 ? Double.parseDouble(t.substring(0, gap)) : 0;
    String fraction = gap > 0 ? t.substring(gap + 1) : t;
    int cut = fraction.indexOf('/');
    return whole
        + Double.parseDouble(fraction.substring(0, cut))
            / Double.parseDouble(fraction.substring(cut + 1));
  }
}
