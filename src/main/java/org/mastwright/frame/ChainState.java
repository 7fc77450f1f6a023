package org.mastwright.frame;

/**
 * Where every node is and how it is turned; the working state of an iteration, modified in place.
 */
final class ChainState {
  final double[][] place_m;
  final double[][] rotation;
  final double[][] cableGuess_N;

  private ChainState(double[][] place_m, double[][] rotation, double[][] cableGuess_N) {
    this.place_m = place_m;
    this.rotation = rotation;
    this.cableGuess_N = cableGuess_N;
  }

  static ChainState atRest(Chain chain) {
    int n = chain.nodes().size();
    double[][] places = new double[n][];
    double[][] rotations = new double[n][];
    for (int i = 0; i < n; i++) {
      places[i] = chain.nodes().get(i).array();
      rotations[i] = Algebra.identity();
    }
    return new ChainState(places, rotations, new double[chain.cables().size()][]);
  }

  ChainState copy() {
    return new ChainState(deep(place_m), deep(rotation), deep(cableGuess_N));
  }

  private static double[][] deep(double[][] a) {
    double[][] out = new double[a.length][];
    for (int i = 0; i < a.length; i++) {
      out[i] = a[i] == null ? null : a[i].clone();
    }
    return out;
  }

  /**
   * Moves by a share of a step: six numbers a node, movement and spin.
   *
   * <p>From the foot up each chord takes the direction the step gives it and the length the step
   * means: the old one and the movement along it. Movement across a chord would else stretch it in
   * the second order, and a stiff mast answers that with forces a hundred times those it bears.
   */
  void move(double[] step, double share) {
    double[] before = place_m[0].clone();
    for (int k = 0; k < 3; k++) {
      place_m[0][k] += share * step[k];
    }
    spin(0, step, share);
    for (int i = 1; i < place_m.length; i++) {
      double[] chord = Algebra.minus(place_m[i], before);
      before = place_m[i].clone();
      double[] change = new double[3];
      for (int k = 0; k < 3; k++) {
        change[k] = share * (step[6 * i + k] - step[6 * (i - 1) + k]);
      }
      double length = Algebra.norm(chord);
      double meant = length + Algebra.dot(chord, change) / length;
      double[] turned = Algebra.plus(chord, change);
      double scale = meant / Algebra.norm(turned);
      for (int k = 0; k < 3; k++) {
        place_m[i][k] = place_m[i - 1][k] + scale * turned[k];
      }
      spin(i, step, share);
    }
  }

  private void spin(int i, double[] step, double share) {
    double[] spin = new double[3];
    for (int k = 0; k < 3; k++) {
      spin[k] = share * step[6 * i + 3 + k];
    }
    rotation[i] = Algebra.product(Algebra.rotation(spin), rotation[i]);
  }
}
