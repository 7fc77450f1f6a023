package org.mastwright.assess;

import java.util.List;

/**
 * A natural frequency.
 *
 * @param state still-air or a case id
 * @param number from 1
 * @param direction the mast top swings along, such as {@code north}, {@code east-west} or {@code
 *     torsion}
 * @param hubParticipationRatio movement of the hub over that of the first mode
 * @param shape along the mast, greatest movement 1
 */
public record ModeResult(
    String state,
    int number,
    double frequency_Hz,
    String direction,
    String description,
    double hubParticipationRatio,
    List<ShapePoint> shape) {
  public ModeResult {
    shape = List.copyOf(shape);
  }

  /** A point of a mode shape: movement along east and north and twist, scaled. */
  public record ShapePoint(
      double height_m, double eastRatio, double northRatio, double twistRatio) {}
}
