package org.mastwright.report;

import java.math.BigDecimal;
import java.math.MathContext;

/** Axes of a chart: thin grid, round values, a title with the unit. */
final class Axes {
  private static final double SIZE = 2.3;

  private Axes() {}

  /** Values along the foot of a chart that reaches from {@code top} down to {@code foot}. */
  static void foot(Svg svg, Scale x, double top, double foot, int about, String title) {
    for (double v : x.ticks(about)) {
      svg.line(x.at(v), top, x.at(v), foot, Svg.FAINT);
      svg.text(x.at(v), foot + 3.2, SIZE, "middle", Svg.QUIET_COLOUR, 0, tick(v));
    }
    svg.line(x.start_mm(), foot, x.end_mm(), foot, Svg.HAIR);
    svg.textMiddle((x.start_mm() + x.end_mm()) / 2, foot + 7, SIZE, title);
  }

  /** Values up the left side of a chart that reaches from {@code left} to {@code right}. */
  static void side(Svg svg, Scale y, double left, double right, int about, String title) {
    for (double v : y.ticks(about)) {
      svg.line(left, y.at(v), right, y.at(v), Svg.FAINT);
      svg.text(left - 1.2, y.at(v) + 0.8, SIZE, "end", Svg.QUIET_COLOUR, 0, tick(v));
    }
    svg.line(left, y.start_mm(), left, y.end_mm(), Svg.HAIR);
    double middle = (y.start_mm() + y.end_mm()) / 2;
    svg.text(left - 9.5, middle, SIZE, "middle", Svg.INK_COLOUR, -90, title);
  }

  /** The grid of {@link #side} without its numbers, for a chart beside another. */
  static void grid(Svg svg, Scale y, double left, double right, int about) {
    for (double v : y.ticks(about)) {
      svg.line(left, y.at(v), right, y.at(v), Svg.FAINT);
    }
    svg.line(left, y.start_mm(), left, y.end_mm(), Svg.HAIR);
  }

  static String tick(double value) {
    BigDecimal rounded = new BigDecimal(value).round(new MathContext(6)).stripTrailingZeros();
    String text = rounded.signum() == 0 ? "0" : rounded.toPlainString();
    return text.replace('-', '−');
  }
}
