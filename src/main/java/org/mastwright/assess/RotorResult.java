package org.mastwright.assess;

import java.util.List;
import org.mastwright.working.Step;

/**
 * What the rotor does.
 *
 * @param model momentum or blade-element
 * @param states one row per state of the machine, the greatest thrust marked
 */
public record RotorResult(
    String model,
    List<CurvePoint> curve,
    List<OperationPoint> operation,
    List<StateRow> states,
    List<Step> steps) {
  public RotorResult {
    curve = List.copyOf(curve);
    operation = List.copyOf(operation);
    states = List.copyOf(states);
    steps = List.copyOf(steps);
  }

  /** A point of the dimensionless curves. */
  public record CurvePoint(
      double tipSpeedRatio, double pitch_rad, double cpCoefficient, double ctCoefficient) {}

  /** A point of operation over wind. */
  public record OperationPoint(
      double wind_mps,
      double speed_radps,
      double power_W,
      double thrust_N,
      double ctCoefficient,
      String state) {}

  /** A row of the state table: unfactored. */
  public record StateRow(
      String state,
      double wind_mps,
      double speed_radps,
      double thrust_N,
      boolean greatest,
      String how) {}
}
