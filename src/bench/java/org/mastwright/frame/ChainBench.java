package org.mastwright.frame;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Factor and solve, and six modes, of a clamped column. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class ChainBench {
  @Param({"60", "600"})
  int nodes;

  private Equilibrium balance;
  private BlockTridiagonal matrix;
  private double[] load;
  private double[] x;

  /** A tube of 12 m. */
  @Setup
  public void prepare() {
    List<Chain.Point> places = new ArrayList<>();
    List<Chain.Beam> beams = new ArrayList<>();
    for (int i = 0; i < nodes; i++) {
      places.add(new Chain.Point(0, 0, 12.0 * i / (nodes - 1)));
      if (i > 0) {
        beams.add(new Chain.Beam(7e8, 6e6, 4.6e6, 1.3e8, 27, 0.1, 0.2));
      }
    }
    Chain chain =
        new Chain(places, beams, List.of(), List.of(), Chain.Base.clamped(), 9.80665);
    balance = EquilibriumSolver.solve(chain, ChainLoad.weightOnly());
    Assembler a = new Assembler(chain, ChainLoad.weightOnly());
    a.assemble(balance.state(), 0, true);
    matrix = a.tangent;
    load = new double[6 * nodes];
    load[6 * nodes - 6] = 1000;
    x = new double[6 * nodes];
  }

  /** One factorisation and one right-hand side. */
  @Benchmark
  public double factorAndSolve() {
    matrix.factor();
    System.arraycopy(load, 0, x, 0, x.length);
    matrix.solve(x);
    double tip = x[6 * nodes - 6];
    double cantilever = 1000 * 12.0 * 12 * 12 / (3 * 6e6);
    if (!(Math.abs(tip / cantilever - 1) < 0.02)) {
      throw new IllegalStateException("tip " + tip + " against " + cantilever);
    }
    return tip;
  }

  /** The six lowest modes with their proof. */
  @Benchmark
  public double sixModes() {
    VibrationSolver.Modes modes =
        VibrationSolver.modes(balance, 6, VibrationSolver.CableMass.NONE);
    if (!modes.complete()) {
      throw new IllegalStateException("a mode was missed");
    }
    return modes.modes().get(0).frequency_Hz();
  }
}
