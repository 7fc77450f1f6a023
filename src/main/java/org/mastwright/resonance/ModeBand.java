package org.mastwright.resonance;

/**
 * The band that one natural frequency covers over all states considered.
 *
 * @param number of the mode in still air, from 1
 * @param description such as {@code first bending, north}
 * @param least_Hz over the states
 * @param greatest_Hz over the states
 * @param hubParticipationRatio movement of the hub over that of the mode that moves it most
 * @param torsion whether the mast mostly twists
 */
public record ModeBand(
    int number,
    String description,
    double least_Hz,
    double greatest_Hz,
    double hubParticipationRatio,
    boolean torsion) {

  /** Below this share of the first mode's hub movement a mode is listed and does not block. */
  static final double LEAST_PARTICIPATION_RATIO = 0.05;

  public ModeBand {
    if (!(least_Hz > 0) || !(greatest_Hz >= least_Hz)) {
      throw new IllegalArgumentException("mode " + number + ": " + least_Hz + "–" + greatest_Hz);
    }
  }

  /** Whether the rotor can shake it: it moves the hub, and a twist only under an upright rotor. */
  boolean blocks(boolean uprightRotor) {
    return hubParticipationRatio >= LEAST_PARTICIPATION_RATIO && (!torsion || uprightRotor);
  }
}
