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

  /** Moves by a share of a step: six numbers a node, movement and spin. */
  void move(double[] step, double share) {
    for (int i = 0; i < place_m.length; i++) {
      double[] spin = new double[3];
      for (int k = 0; k < 3; k++) {
        place_m[i][k] += share * step[6 * i + k];
        spin[k] = share * step[6 * i + 3 + k];
      }
      rotation[i] = Algebra.product(Algebra.rotation(spin), rotation[i]);
    }
  }
}
