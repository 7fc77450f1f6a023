package org.mastwright.units;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** How numbers are printed: no locale, no exponent in the usual range, no false figures. */
public final class Numbers {
  private static final double LARGEST_PLAIN = 1e7;
  private static final double SMALLEST_PLAIN = 1e-4;

  private Numbers() {}

  /**
   * A number rounded to {@code digits} significant figures, without an exponent where it can be
   * read without one. Integers above the figures asked for keep their zeros.
   */
  public static String significant(double value, int digits) {
    if (!Double.isFinite(value)) {
      return Double.isNaN(value) ? "not a number" : value > 0 ? "∞" : "−∞";
    }
    if (value == 0) {
      return "0";
    }
    BigDecimal rounded = new BigDecimal(value).round(new MathContext(digits, RoundingMode.HALF_UP));
    double size = Math.abs(value);
    if (size >= LARGEST_PLAIN || size < SMALLEST_PLAIN) {
      int exponent = rounded.precision() - rounded.scale() - 1;
      BigDecimal mantissa = rounded.movePointLeft(exponent);
      return signed(mantissa.toPlainString()) + "·10" + superscript(exponent);
    }
    return signed(rounded.toPlainString());
  }

  /** A number with a fixed count of decimals. */
  public static String fixed(double value, int decimals) {
    if (!Double.isFinite(value)) {
      return significant(value, 3);
    }
    String text = new BigDecimal(value).setScale(decimals, RoundingMode.HALF_UP).toPlainString();
    boolean zero = text.chars().allMatch(c -> c == '0' || c == '.' || c == '-');
    return signed(zero && text.startsWith("-") ? text.substring(1) : text);
  }

  /** A utilisation with two decimals, rounded up, never down: 1.0004 prints 1.01. */
  public static String utilisation(double utilisationRatio) {
    if (!Double.isFinite(utilisationRatio)) {
      return significant(utilisationRatio, 3);
    }
    return BigDecimal.valueOf(utilisationRatio).setScale(2, RoundingMode.CEILING).toPlainString();
  }

  private static String signed(String text) {
    return text.startsWith("-") ? "−" + text.substring(1) : text;
  }

  private static String superscript(int exponent) {
    String raised = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    StringBuilder out = new StringBuilder(exponent < 0 ? "⁻" : "");
    for (char digit : Integer.toString(Math.abs(exponent)).toCharArray()) {
      out.append(raised.charAt(digit - '0'));
    }
    return out.toString();
  }
}
