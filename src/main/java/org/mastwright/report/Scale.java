package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;

/**
 * Where a value lies on paper: the only place of the report with arithmetic, and that of drawings
 * alone.
 *
 * @param from value at {@code start_mm}
 * @param to value at {@code end_mm}
 */
record Scale(double from, double to, double start_mm, double end_mm) {
  /** Ratios that a draughtsman would choose. */
  private static final int[] RATIOS = {
    10, 20, 25, 50, 75, 100, 125, 150, 200, 250, 300, 400, 500, 750, 1000, 1500, 2000, 5000
  };

  private static final double[] STEPS = {1, 2, 2.5, 5, 10};

  Scale {
    if (!(to > from)) {
      throw new IllegalArgumentException("scale from " + from + " to " + to);
    }
  }

  /** The place of a value. */
  double at(double value) {
    return start_mm + (value - from) / (to - from) * (end_mm - start_mm);
  }

  /** A scale from 0 to a round number not below {@code greatest}. */
  static Scale fromZero(double greatest, double start_mm, double end_mm, int ticks) {
    double top = greatest > 0 ? greatest : 1;
    double step = step(top / ticks);
    return new Scale(0, step * Math.ceil(top / step - 1e-9), start_mm, end_mm);
  }

  /** Round values from one end to the other. */
  List<Double> ticks(int about) {
    double step = step((to - from) / about);
    List<Double> ticks = new ArrayList<>();
    for (long i = (long) Math.ceil(from / step - 1e-9); i * step <= to + 1e-9 * step; i++) {
      ticks.add(i * step);
    }
    return ticks;
  }

  private static double step(double least) {
    double power = Math.pow(10, Math.floor(Math.log10(least)));
    for (double s : STEPS) {
      if (s * power >= least * (1 - 1e-9)) {
        return s * power;
      }
    }
    return 10 * power;
  }

  /** The largest drawing (1 to n) at which {@code size_m} fits into {@code room_mm}. */
  static int ratio(double width_m, double roomAcross_mm, double height_m, double roomUp_mm) {
    for (int n : RATIOS) {
      if (1000 * width_m / n <= roomAcross_mm && 1000 * height_m / n <= roomUp_mm) {
        return n;
      }
    }
    double needed = Math.max(1000 * width_m / roomAcross_mm, 1000 * height_m / roomUp_mm);
    return (int) (10_000 * Math.ceil(needed / 10_000));
  }

  /** Millimetres on paper of a length at one to {@code ratio}. */
  static double paper_mm(double length_m, int ratio) {
    return 1000 * length_m / ratio;
  }

  /** A round length for a scale bar of at most {@code room}, in the reader's unit. */
  static double roundBelow(double room) {
    double power = Math.pow(10, Math.floor(Math.log10(room)));
    double best = power;
    for (double s : new double[] {1, 2, 5}) {
      if (s * power <= room) {
        best = s * power;
      }
    }
    return best;
  }

  /** East of a point at a distance along a bearing. */
  static double east(double bearing_rad, double distance) {
    return distance * Math.sin(bearing_rad);
  }

  /** North of a point at a distance along a bearing. */
  static double north(double bearing_rad, double distance) {
    return distance * Math.cos(bearing_rad);
  }

  /** Without its sign. */
  static double size(double value) {
    return Math.abs(value);
  }
}
