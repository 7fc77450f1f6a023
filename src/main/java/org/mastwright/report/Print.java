package org.mastwright.report;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.regex.Pattern;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;
import org.mastwright.units.UnitSystem;

/** Numbers and words as this reader wants them. */
record Print(UnitSystem units) {
  static final String NOT_GIVEN = "not given";
  private static final int FIGURES = 3;
  private static final int MOST_DECIMALS = 6;
  private static final Pattern TEMPERATURE = Pattern.compile("(?<=\\d| ) ?deg([CF])\\b");
  private static final Pattern ANGLE = Pattern.compile("(?<=\\d) deg\\b");

  /** A value in the reader's unit or units. */
  String of(double si, Unit unit) {
    return symbols(units.print(si, unit));
  }

  /** The value, or {@code not given}. */
  String of(OptionalDouble si, Unit unit) {
    return si.isPresent() ? of(si.getAsDouble(), unit) : NOT_GIVEN;
  }

  /** In the first of the reader's units only: for drawings, where room is short. */
  String one(double si, Unit unit) {
    return symbols(first(unit).print(si, FIGURES));
  }

  /** The unit that drawings and charts are in. */
  Unit first(Unit unit) {
    return units == UnitSystem.US ? unit.american().orElse(unit) : unit;
  }

  /** A whole-degree bearing, three digits, clockwise from true north. */
  static String bearing(double bearing_rad) {
    String degrees = Numbers.fixed(Unit.DEG.fromSi(bearing_rad), 1);
    return (degrees.endsWith(".0") ? degrees.substring(0, degrees.length() - 2) : degrees) + "°";
  }

  static String words(String text) {
    return text.isBlank() ? NOT_GIVEN : text;
  }

  static String yesNo(boolean so) {
    return so ? "yes" : "no";
  }

  static String factor(double valueFactor) {
    return Numbers.significant(valueFactor, FIGURES);
  }

  /** Unit words of the tower file as signs. */
  static String symbols(String printed) {
    String warm = TEMPERATURE.matcher(printed).replaceAll(" °$1");
    return ANGLE.matcher(warm).replaceAll("°").replace("1/degF", "1/°F");
  }

  /** At most {@code length} characters; what is cut off is marked. */
  static String shorten(String text, int length) {
    return text.length() <= length ? text : text.substring(0, length - 1).stripTrailing() + "…";
  }

  /** A head with its unit or units: {@code shear, kN (kip)}. */
  String head(String words, Unit unit) {
    return words + ", " + unitWord(unit);
  }

  /** {@code kN}, {@code kip} or {@code kN (kip)}. */
  String unitWord(Unit unit) {
    String metric = symbols(" " + unit.symbol()).strip();
    String american = symbols(" " + unit.american().orElse(unit).symbol()).strip();
    return switch (units) {
      case SI -> metric;
      case US -> american;
      case BOTH -> metric.equals(american) ? metric : metric + " (" + american + ")";
    };
  }

  /** A column of numbers with the same decimals, so that the points stand below each other. */
  List<String> column(List<Double> si, Unit unit) {
    Unit american = unit.american().orElse(unit);
    List<String> metric = column(si, unit, decimals(si, unit));
    if (units == UnitSystem.SI || american.equals(unit)) {
      return metric;
    }
    List<String> us = column(si, american, decimals(si, american));
    if (units == UnitSystem.US) {
      return us;
    }
    List<String> both = new ArrayList<>();
    for (int i = 0; i < metric.size(); i++) {
      both.add(metric.get(i) + " (" + us.get(i) + ")");
    }
    return both;
  }

  private static List<String> column(List<Double> si, Unit unit, int decimals) {
    return si.stream().map(v -> Numbers.fixed(unit.fromSi(v), decimals)).toList();
  }

  /** Decimals that give the greatest number of a column three figures. */
  private static int decimals(List<Double> si, Unit unit) {
    BigDecimal greatest = BigDecimal.ZERO;
    for (double v : si) {
      greatest = greatest.max(new BigDecimal(unit.fromSi(v)).abs());
    }
    if (greatest.signum() == 0) {
      return 0;
    }
    int whole = greatest.precision() - greatest.scale();
    if (whole < -MOST_DECIMALS) {
      return 0;
    }
    int decimals = FIGURES - whole;
    return decimals < 0 ? 0 : decimals > MOST_DECIMALS ? MOST_DECIMALS : decimals;
  }

  /** The first sixteen characters of the input's hash, in fours. */
  static String mark(String sha256) {
    String head = sha256.length() > 16 ? sha256.substring(0, 16) : sha256;
    return head.replaceAll("(.{4})(?=.)", "$1 ");
  }
}
