package org.mastwright.file;

import org.mastwright.units.Unit;

/** The SI unit of a value's dimension, as results.json names it. */
final class SiUnits {
  private SiUnits() {}

  static String of(Unit unit) {
    return switch (unit.dimension()) {
      case FORCE -> "N";
      case MOMENT -> "N·m";
      case LENGTH -> "m";
      case PRESSURE -> "Pa";
      case ANGLE -> "rad";
      case FREQUENCY -> "Hz";
      default -> "";
    };
  }
}
