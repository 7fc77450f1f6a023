package org.mastwright.report;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;

/**
 * A drawing in millimetres, written by hand so that the same data give the same bytes. Every
 * drawing carries words for those who cannot see it.
 */
final class Svg {
  /** A stroke: colour, width, and dashes or blank. */
  record Stroke(String colour, double width_mm, String dashes) {
    Stroke thick(double width) {
      return new Stroke(colour, width, dashes);
    }

    Stroke dashed(String pattern) {
      return new Stroke(colour, width_mm, pattern);
    }
  }

  /** A point on paper. */
  record Point(double x, double y) {}

  static final Stroke INK = new Stroke("#1b1f24", 0.25, "");
  static final Stroke HAIR = new Stroke("#9aa3ad", 0.12, "");
  static final Stroke FAINT = new Stroke("#d5dae0", 0.12, "");
  static final Stroke BLUE = new Stroke("#1f5a8a", 0.35, "");
  static final Stroke RUST = new Stroke("#a6470f", 0.35, "1.6 0.8");
  static final Stroke GREEN = new Stroke("#2b6e5d", 0.35, "0.4 0.7");
  static final String NONE = "none";
  static final String INK_COLOUR = "#1b1f24";
  static final String QUIET_COLOUR = "#5b6470";

  private final double width_mm;
  private final double height_mm;
  private final StringBuilder out = new StringBuilder();

  Svg(double width_mm, double height_mm) {
    this.width_mm = width_mm;
    this.height_mm = height_mm;
  }

  Svg line(double x1, double y1, double x2, double y2, Stroke stroke) {
    out.append("<line x1=\"").append(mm(x1)).append("\" y1=\"").append(mm(y1));
    out.append("\" x2=\"").append(mm(x2)).append("\" y2=\"").append(mm(y2)).append('"');
    return close(stroke, NONE);
  }

  Svg polyline(List<Point> points, Stroke stroke) {
    return path("polyline", points, stroke, NONE);
  }

  Svg polygon(List<Point> points, Stroke stroke, String fill) {
    return path("polygon", points, stroke, fill);
  }

  private Svg path(String element, List<Point> points, Stroke stroke, String fill) {
    out.append('<').append(element).append(" points=\"");
    for (Point p : points) {
      out.append(mm(p.x())).append(',').append(mm(p.y())).append(' ');
    }
    out.append('"');
    return close(stroke, fill);
  }

  Svg rect(double x, double y, double width, double height, Stroke stroke, String fill) {
    out.append("<rect x=\"").append(mm(x)).append("\" y=\"").append(mm(y));
    out.append("\" width=\"").append(mm(width)).append("\" height=\"").append(mm(height));
    out.append('"');
    return close(stroke, fill);
  }

  Svg circle(double x, double y, double radius, Stroke stroke) {
    return ellipse(x, y, radius, radius, stroke, NONE);
  }

  Svg dot(double x, double y, double radius) {
    return ellipse(x, y, radius, radius, INK, INK_COLOUR);
  }

  Svg ellipse(double x, double y, double across, double up, Stroke stroke, String fill) {
    out.append("<ellipse cx=\"").append(mm(x)).append("\" cy=\"").append(mm(y));
    out.append("\" rx=\"").append(mm(across)).append("\" ry=\"").append(mm(up)).append('"');
    return close(stroke, fill);
  }

  private Svg close(Stroke stroke, String fill) {
    out.append(" fill=\"").append(fill).append("\" stroke=\"").append(stroke.colour());
    out.append("\" stroke-width=\"").append(mm(stroke.width_mm())).append('"');
    if (!stroke.dashes().isEmpty()) {
      out.append(" stroke-dasharray=\"").append(stroke.dashes()).append('"');
    }
    out.append("/>");
    return this;
  }

  Svg text(double x, double y, double size_mm, String words) {
    return text(x, y, size_mm, "start", INK_COLOUR, 0, words);
  }

  Svg textEnd(double x, double y, double size_mm, String words) {
    return text(x, y, size_mm, "end", INK_COLOUR, 0, words);
  }

  Svg textMiddle(double x, double y, double size_mm, String words) {
    return text(x, y, size_mm, "middle", INK_COLOUR, 0, words);
  }

  Svg text(
      double x,
      double y,
      double size_mm,
      String anchor,
      String colour,
      int turn_deg,
      String words) {
    out.append("<text x=\"").append(mm(x)).append("\" y=\"").append(mm(y));
    out.append("\" font-family=\"'Noto Sans','Noto Sans Math','Noto Sans Mono'\" font-size=\"")
        .append(mm(size_mm));
    out.append("\" text-anchor=\"").append(anchor).append("\" fill=\"").append(colour).append('"');
    if (turn_deg != 0) {
      out.append(" transform=\"rotate(").append(turn_deg).append(' ').append(mm(x));
      out.append(' ').append(mm(y)).append(")\"");
    }
    out.append('>').append(escape(words)).append("</text>");
    return this;
  }

  /** A letter in a circle that the tables beside the drawing refer to. */
  Svg letter(double x, double y, String letter) {
    ellipse(x, y, 2.1, 2.1, INK, "#ffffff");
    return textMiddle(x, y + 1.0, 2.9, letter);
  }

  /** Slanting lines that fill a rectangle, so that an area is told apart without colour. */
  Svg hatch(double x, double y, double width, double height, double gap, Stroke stroke) {
    for (double k = gap; k < width + height; k += gap) {
      double x1 = k < width ? x + k : x + width;
      double y1 = k < width ? y : y + k - width;
      double x2 = k < height ? x : x + k - height;
      double y2 = k < height ? y + k : y + height;
      line(x1, y1, x2, y2, stroke);
    }
    return this;
  }

  /** The finished element with the words that stand for it. */
  String end(String words) {
    String w = mm(width_mm);
    String h = mm(height_mm);
    return "<svg xmlns=\"http://www.w3.org/2000/svg\" alt=\""
        + escape(words)
        + "\" viewBox=\"0 0 "
        + w
        + " "
        + h
        + "\" width=\""
        + w
        + "mm\" height=\""
        + h
        + "mm\" style=\"width:"
        + w
        + "mm;height:"
        + h
        + "mm\">"
        + out
        + "</svg>";
  }

  static String escape(String text) {
    return text.replace("&", "&amp;")
        .replace("<", "&lt;")
        .replace(">", "&gt;")
        .replace("\"", "&quot;");
  }

  private static String mm(double value) {
    BigDecimal rounded = BigDecimal.valueOf(value).setScale(2, RoundingMode.HALF_UP);
    return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
  }
}
