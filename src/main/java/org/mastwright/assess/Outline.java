package org.mastwright.assess;

import java.util.OptionalDouble;

/**
 * Heights above the datum and distances that the first page and the drawings name.
 *
 * @param fallRadius_m everything within it can be struck when the tower falls: the greatest height
 * @param reach_m from the tower axis to the blade tip at its furthest, level
 */
public record Outline(
    double mastTop_m,
    OptionalDouble hub_m,
    OptionalDouble lowestBlade_m,
    OptionalDouble highestBlade_m,
    OptionalDouble reach_m,
    double fallRadius_m) {}
