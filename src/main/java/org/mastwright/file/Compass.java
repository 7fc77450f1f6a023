package org.mastwright.file;

import java.util.List;

/** The sixteen points. */
final class Compass {
  private static final List<String> LETTERS =
      List.of(
          "N", "NNE", "NE", "ENE", "E", "ESE", "SE", "SSE", "S", "SSW", "SW", "WSW", "W", "WNW",
          "NW", "NNW");

  private Compass() {}

  /** Index of a point from north by the east, or -1. */
  static int index(String letters) {
    return LETTERS.indexOf(letters);
  }

  /** The nearest point to a bearing. */
  static String point(double bearing_rad) {
    int sixteenth = (int) Math.round(bearing_rad / (Math.PI / 8));
    return LETTERS.get(Math.floorMod(sixteenth, LETTERS.size()));
  }
}
