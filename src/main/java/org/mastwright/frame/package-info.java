/**
 * Chain mechanics: beams in a row with cables hanging off them. Knows nodes, not towers.
 *
 * <p>Axes x east, y north, z up. A rotation is a spin about fixed axes. A cable tension is
 * positive. Arrays of three are vectors; arrays of nine are 3×3 matrices, row by row.
 */
package org.mastwright.frame;
