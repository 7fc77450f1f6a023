package org.mastwright.frame;

import static org.mastwright.frame.Algebra.dot;
import static org.mastwright.frame.Algebra.minus;
import static org.mastwright.frame.Algebra.norm;
import static org.mastwright.frame.Algebra.plus;
import static org.mastwright.frame.Algebra.times;

import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * An elastic cable hanging between two points under loads per unstretched length that are constant
 * over each of its equal parts: exact, in space, taut or slack.
 *
 * <p>With the tension vector {@code T(s) = T₀ − w s} the place along the cable is {@code x' = T/|T|
 * + T/EA}; both integrate in closed form. {@code T₀} is found by Newton's method on the
 * complementary energy, which is convex, so that a line search always arrives.
 */
public final class Catenary {
  private static final int MOST_ITERATIONS = 200;

  /** Below this ratio of load to tension over a part the closed form cancels; Gauss is exact. */
  private static final double NEARLY_STRAIGHT_RATIO = 0.05;

  private static final double[] GAUSS_AT = {
    -0.932469514203152, -0.661209386466265, -0.238619186083197,
    0.238619186083197, 0.661209386466265, 0.932469514203152
  };
  private static final double[] GAUSS_WEIGHT = {
    0.171324492379170, 0.360761573048139, 0.467913934572691,
    0.467913934572691, 0.360761573048139, 0.171324492379170
  };

  private final double axial_N;
  private final double part_m;
  private final double[][] loads_Npm;
  private final double[] lower_N;
  private final double[] upper_N;
  private final double[] stiffness;

  private Catenary(
      double axial_N, double part_m, double[][] loads_Npm, double[] lower_N, double[] stiffness) {
    this.axial_N = axial_N;
    this.part_m = part_m;
    this.loads_Npm = loads_Npm;
    this.lower_N = lower_N;
    double[] upper = lower_N;
    for (double[] w : loads_Npm) {
      upper = minus(upper, times(part_m, w));
    }
    this.upper_N = upper;
    this.stiffness = stiffness;
  }

  /**
   * The cable from the origin to {@code span_m}.
   *
   * @param unstretched_m length without tension
   * @param loads_Npm one vector per equal part, weight included
   * @param guess_N tension vector at the lower end to start from, or null
   */
  static Catenary between(
      double[] span_m,
      double axial_N,
      double unstretched_m,
      double[][] loads_Npm,
      double[] guess_N) {
    double part_m = unstretched_m / loads_Npm.length;
    if (Arrays.stream(loads_Npm).allMatch(w -> norm(w) == 0)) {
      return weightless(span_m, axial_N, unstretched_m, loads_Npm);
    }
    double[] t = guess_N != null ? guess_N : guess(span_m, axial_N, unstretched_m, loads_Npm);
    double[] place = new double[3];
    double[] flexibility = new double[9];
    double energy = integrate(t, axial_N, part_m, loads_Npm, place, flexibility) - dot(t, span_m);
    double tolerance_m = 1e-13 * (norm(span_m) + unstretched_m);
    for (int i = 0; i < MOST_ITERATIONS; i++) {
      double[] gap = minus(place, span_m);
      if (norm(gap) <= tolerance_m) {
        return new Catenary(axial_N, part_m, loads_Npm, t, Algebra.inverse(flexibility));
      }
      double[] step = times(-1, Algebra.solve(flexibility, gap));
      double slope = dot(gap, step);
      double share = 1;
      double[] next;
      double nextEnergy;
      do {
        next = plus(t, times(share, step));
        nextEnergy =
            integrate(next, axial_N, part_m, loads_Npm, place, flexibility) - dot(next, span_m);
        share /= 2;
      } while (nextEnergy > energy + 1e-4 * share * slope + 1e-12 * Math.abs(energy)
          && share > 1e-10);
      boolean settled = norm(minus(next, t)) <= 4e-16 * norm(t);
      t = next;
      energy = nextEnergy;
      if (settled || i > 60 && norm(minus(place, span_m)) < 1e3 * tolerance_m) {
        return new Catenary(axial_N, part_m, loads_Npm, t, Algebra.inverse(flexibility));
      }
    }
    throw new EquilibriumException(
        EquilibriumException.Cause.NO_CONVERGENCE,
        0,
        MOST_ITERATIONS,
        "a cable of " + unstretched_m + " m over " + norm(span_m) + " m did not settle");
  }

  /** Without any load it is a straight bar in tension, or hangs without force. */
  private static Catenary weightless(
      double[] span_m, double axial_N, double unstretched_m, double[][] loads_Npm) {
    double chord_m = norm(span_m);
    double[] e = times(1 / chord_m, span_m);
    double pull_N = Math.max(0, axial_N * (chord_m / unstretched_m - 1));
    double[] stiffness = new double[9];
    if (pull_N > 0) {
      for (int i = 0; i < 3; i++) {
        for (int j = 0; j < 3; j++) {
          stiffness[3 * i + j] =
              axial_N / unstretched_m * e[i] * e[j]
                  + pull_N / chord_m * ((i == j ? 1 : 0) - e[i] * e[j]);
        }
      }
    }
    double part_m = unstretched_m / loads_Npm.length;
    return new Catenary(axial_N, part_m, loads_Npm, times(pull_N, e), stiffness);
  }

  /** A cable under its own weight and constant loads, for queries. */
  public static Catenary between(
      Chain.Point span_m,
      double axial_N,
      double unstretched_m,
      List<ChainLoad.Components> parts_Npm) {
    return between(span_m.array(), axial_N, unstretched_m, arrays(parts_Npm), null);
  }

  static double[][] arrays(List<ChainLoad.Components> parts) {
    return parts.stream().map(ChainLoad.Components::array).toArray(double[][]::new);
  }

  /** A parabola's tension: by strain where it is taut, by sag where it is not. */
  private static double[] guess(
      double[] span_m, double axial_N, double unstretched_m, double[][] loads_Npm) {
    double[] total = new double[3];
    for (double[] w : loads_Npm) {
      total = plus(total, times(unstretched_m / loads_Npm.length, w));
    }
    double chord_m = norm(span_m);
    double[] along = times(1 / chord_m, span_m);
    double[] across = minus(total, times(dot(total, along), along));
    double load_N = Math.max(norm(across), 1e-9 * axial_N);
    double stretch = chord_m / unstretched_m - 1;
    double slackShare = Math.max(-stretch, 1e-8);
    double sagging_N = load_N / Math.sqrt(24 * slackShare);
    double pull_N = stretch > 0 ? axial_N * stretch + load_N : Math.min(sagging_N, 0.1 * axial_N);
    return plus(times(pull_N, along), times(0.5, total));
  }

  /**
   * Place of the upper end and its derivative by the tension at the lower end.
   *
   * @param place_m modified: the upper end
   * @param flexibility modified: the derivative
   * @return the complementary energy
   */
  private static double integrate(
      double[] lower_N,
      double axial_N,
      double part_m,
      double[][] loads_Npm,
      double[] place_m,
      double[] flexibility) {
    Arrays.fill(place_m, 0);
    Arrays.fill(flexibility, 0);
    double energy = 0;
    double[] t = lower_N;
    for (double[] w : loads_Npm) {
      double[] next = minus(t, times(part_m, w));
      energy += elastic(t, next, axial_N, part_m, place_m, flexibility);
      double size = norm(w) * part_m;
      energy +=
          size <= NEARLY_STRAIGHT_RATIO * Math.min(norm(t), norm(next))
              ? straight(t, w, part_m, place_m, flexibility)
              : curved(t, next, w, place_m, flexibility);
      t = next;
    }
    return energy;
  }

  /** The stretch: {@code ∫ T/EA ds}. */
  private static double elastic(
      double[] t, double[] next, double axial_N, double part_m, double[] place, double[] flex) {
    for (int k = 0; k < 3; k++) {
      place[k] += part_m * (t[k] + next[k]) / (2 * axial_N);
      flex[4 * k] += part_m / axial_N;
    }
    return part_m * (dot(t, t) + dot(t, next) + dot(next, next)) / (6 * axial_N);
  }

  /** {@code ∫ T/|T| ds} by quadrature where the direction hardly turns. */
  private static double straight(
      double[] t, double[] w, double part_m, double[] place, double[] flex) {
    double energy = 0;
    for (int g = 0; g < GAUSS_AT.length; g++) {
      double s = part_m * (1 + GAUSS_AT[g]) / 2;
      double weight = part_m * GAUSS_WEIGHT[g] / 2;
      double[] here = minus(t, times(s, w));
      double size = norm(here);
      double[] e = times(1 / size, here);
      energy += weight * size;
      for (int i = 0; i < 3; i++) {
        place[i] += weight * e[i];
        for (int j = 0; j < 3; j++) {
          flex[3 * i + j] += weight * ((i == j ? 1 : 0) - e[i] * e[j]) / size;
        }
      }
    }
    return energy;
  }

  /** The same in closed form, along the load and across it. */
  private static double curved(
      double[] t, double[] next, double[] load, double[] place, double[] flex) {
    double w = norm(load);
    double[] along = times(1 / w, load);
    double v0 = dot(t, along);
    double v1 = dot(next, along);
    double[] acrossVector = minus(t, times(v0, along));
    double h = norm(acrossVector);
    double t0 = Math.hypot(v0, h);
    double t1 = Math.hypot(v1, h);
    double[] across = h > 0 ? times(1 / h, acrossVector) : new double[3];
    double arc = arcsinhDifference(v0, t0, v1, t1, h);
    double ratio = v0 / t0 - v1 / t1;
    double alongAlong = ratio / w;
    double acrossAcross = (arc - ratio) / w;
    double mixed = h / w * (1 / t0 - 1 / t1);
    double normal = arc / w;
    double[] third = Algebra.cross(along, across);
    for (int i = 0; i < 3; i++) {
      place[i] += (t0 - t1) / w * along[i] + h * arc / w * across[i];
      for (int j = 0; j < 3; j++) {
        flex[3 * i + j] +=
            alongAlong * along[i] * along[j]
                + acrossAcross * across[i] * across[j]
                + mixed * (along[i] * across[j] + across[i] * along[j])
                + normal * third[i] * third[j];
      }
    }
    return (v0 * t0 - v1 * t1 + h * h * arc) / (2 * w);
  }

  /** {@code asinh(v0/h) − asinh(v1/h)} without cancellation. */
  private static double arcsinhDifference(double v0, double t0, double v1, double t1, double h) {
    if (v0 >= 0 && v1 >= 0) {
      return Math.log((v0 + t0) / (v1 + t1));
    }
    if (v0 <= 0 && v1 <= 0) {
      return Math.log((t1 - v1) / (t0 - v0));
    }
    double floor = Math.max(h, 1e-12 * (t0 + t1));
    return Math.log((Math.abs(v0) + t0) / floor * ((Math.abs(v1) + t1) / floor)) * Math.signum(v0);
  }

  /** Tension vector at the lower end, pointing up along the cable: what it does to its anchor. */
  double[] lower() {
    return lower_N;
  }

  /**
   * Tension vector at the upper end, pointing on along the cable: minus what it does to the mast.
   */
  double[] upper() {
    return upper_N;
  }

  /** How the force on the upper end answers its movement, 3×3: {@code dT = K dx}. */
  double[] stiffness() {
    return stiffness;
  }

  /** Mean stiffness of the upper end against level movement. */
  public double levelStiffness_Npm() {
    return (stiffness[0] + stiffness[4]) / 2;
  }

  /** Level part of the tension: the same all along where the loads are weight only. */
  public double levelPull_N() {
    return Math.hypot(upper_N[0], upper_N[1]);
  }

  public double lowerTension_N() {
    return norm(lower_N);
  }

  public double upperTension_N() {
    return norm(upper_N);
  }

  /** Points along the cable from its lower end, {@code pieces + 1} of them, from the lower end. */
  public List<Chain.Point> shape_m(int pieces) {
    double length_m = part_m * loads_Npm.length;
    Chain.Point[] points = new Chain.Point[pieces + 1];
    for (int i = 0; i <= pieces; i++) {
      points[i] = Chain.Point.of(placeFrom(lower_N, 0, length_m * i / pieces));
    }
    return List.of(points);
  }

  /** Tension vector at an unstretched length from the lower end. */
  double[] tensionAt(double along_m) {
    double[] t = lower_N;
    double left_m = along_m;
    for (double[] w : loads_Npm) {
      double here_m = Math.min(left_m, part_m);
      t = minus(t, times(here_m, w));
      left_m -= here_m;
    }
    return t;
  }

  /** The way from one place along the cable to another, starting with a known tension. */
  private double[] placeFrom(double[] tension_N, double from_m, double length_m) {
    double[] sum = new double[3];
    double[] t = tension_N;
    double at_m = from_m;
    double end_m = from_m + length_m;
    while (end_m - at_m > 1e-12 * part_m) {
      int part = Math.min((int) (at_m / part_m + 1e-9), loads_Npm.length - 1);
      double here_m = Math.min(end_m, (part + 1) * part_m) - at_m;
      double[] place = new double[3];
      integrate(t, axial_N, here_m, new double[][] {loads_Npm[part]}, place, new double[9]);
      sum = plus(sum, place);
      t = minus(t, times(here_m, loads_Npm[part]));
      at_m += here_m;
    }
    return sum;
  }

  /**
   * The unstretched length that gives a tension at an end, under the loads.
   *
   * @param atLowerEnd at the anchor, else at the mast
   */
  public static double unstretchedForTension_m(
      Chain.Point span_m,
      double axial_N,
      double tension_N,
      boolean atLowerEnd,
      List<ChainLoad.Components> parts_Npm) {
    double[] span = span_m.array();
    double chord_m = norm(span);
    double[][] loads = arrays(parts_Npm);
    double shortest_m = chord_m / (1 + 2 * tension_N / axial_N);
    double longest_m = chord_m * 1.5;
    UnivariateFunction excess =
        length_m -> {
          Catenary c = between(span, axial_N, length_m, loads, null);
          return (atLowerEnd ? c.lowerTension_N() : c.upperTension_N()) - tension_N;
        };
    while (excess.value(shortest_m) < 0) {
      shortest_m *= 0.999;
    }
    // the tension falls as the length grows until the cable hangs: go only as far as it falls
    double step_m = chord_m * 1e-4;
    double from_m = shortest_m;
    double to_m = shortest_m + step_m;
    while (excess.value(to_m) > 0) {
      from_m = to_m;
      step_m *= 1.5;
      to_m += step_m;
      if (to_m > longest_m) {
        throw new EquilibriumException(
            EquilibriumException.Cause.NO_CONVERGENCE,
            0,
            0,
            "a tension of " + tension_N + " N is less than the cable's own weight gives");
      }
    }
    return new BrentSolver(1e-15, 1e-13 * chord_m).solve(200, excess, from_m, to_m);
  }

  /** Sag at mid-length below the chord, measured square to the chord. */
  public double sag_m() {
    double length_m = part_m * loads_Npm.length;
    double[] middle = placeFrom(lower_N, 0, length_m / 2);
    double[] end = placeFrom(lower_N, 0, length_m);
    double[] along = times(1 / norm(end), end);
    return norm(minus(middle, times(dot(middle, along), along)));
  }

  /** Frequency {@code n} of a taut string: {@code (n/2L)·√(T/m)}. */
  public static double tautStringFrequency_Hz(
      int number, double length_m, double tension_N, double mass_kgpm) {
    return number / (2 * length_m) * Math.sqrt(tension_N / mass_kgpm);
  }

  /** Time of {@code returns} pulses along a taut string: {@code 2 N L √(m/T)}. */
  public static double pulseTime_s(
      int returns, double length_m, double tension_N, double mass_kgpm) {
    return 2 * returns * length_m * Math.sqrt(mass_kgpm / tension_N);
  }

  /**
   * First symmetric in-plane mode of a sagging cable over the first taut-string mode: root of
   * {@code tan(ω/2) = ω/2 − (4/λ²)(ω/2)³}, over π (Irvine; recalled).
   */
  public static double symmetricModeFactor(double irvineFactor) {
    UnivariateFunction f =
        half -> Math.sin(half) - (half - 4 / irvineFactor * half * half * half) * Math.cos(half);
    double half = Math.PI / 2;
    double end = 1.5 * Math.PI;
    return 2 / Math.PI * new BrentSolver(1e-14, 1e-14).solve(200, f, half + 1e-9, end - 1e-9);
  }
}
