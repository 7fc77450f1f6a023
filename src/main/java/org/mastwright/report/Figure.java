package org.mastwright.report;

/**
 * A drawing or chart.
 *
 * @param svg the drawing
 * @param caption what it shows; holds the key numbers, since a drawing cannot be searched
 */
public record Figure(String svg, String caption) {}
