package org.mastwright.assess;

import java.util.List;

/**
 * Rotor speeds to avoid and clear ranges.
 *
 * @param orders excitations per turn that were looked at
 * @param windowsToAvoid sorted, merged, within the speed range
 * @param clear what is left of the range
 * @param lines frequencies that the chart draws as bands
 */
public record SpeedResult(
    List<Integer> orders,
    double lowest_radps,
    double highest_radps,
    List<Window> windowsToAvoid,
    List<Range> clear,
    List<FrequencyBand> lines,
    List<String> remarks) {
  public SpeedResult {
    orders = List.copyOf(orders);
    windowsToAvoid = List.copyOf(windowsToAvoid);
    clear = List.copyOf(clear);
    lines = List.copyOf(lines);
    remarks = List.copyOf(remarks);
  }

  /** A range of rotor speed. */
  public record Range(double from_radps, double to_radps) {}

  /** A window to avoid and why. */
  public record Window(
      double from_radps, double to_radps, double least_Hz, double greatest_Hz, String why) {}

  /** The band of one natural frequency over the states considered. */
  public record FrequencyBand(
      int mode, String description, double least_Hz, double greatest_Hz, boolean blocks) {}
}
