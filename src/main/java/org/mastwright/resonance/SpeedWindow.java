package org.mastwright.resonance;

/**
 * A range of rotor speed in which an excitation meets a natural frequency, margin included.
 *
 * @param from_radps rotor speed where it begins
 * @param to_radps rotor speed where it ends
 */
public record SpeedWindow(
    ModeBand mode, Excitation excitation, double from_radps, double to_radps) {

  /** {@code Ω = 2π f (1 ∓ margin) / order} at the two edges of the mode's band. */
  static SpeedWindow of(ModeBand mode, Excitation excitation, double marginRatio) {
    double perHz_rad = 2 * Math.PI / excitation.order();
    return new SpeedWindow(
        mode,
        excitation,
        mode.least_Hz() * (1 - marginRatio) * perHz_rad,
        mode.greatest_Hz() * (1 + marginRatio) * perHz_rad);
  }

  boolean overlaps(double from, double to) {
    return from_radps < to && to_radps > from;
  }
}
