package org.mastwright.mast;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;
import java.util.stream.IntStream;
import org.mastwright.design.Tower;
import org.mastwright.forces.Vector3;
import org.mastwright.frame.Chain;
import org.mastwright.frame.ChainLoad;
import org.mastwright.frame.Equilibrium;
import org.mastwright.frame.EquilibriumException;
import org.mastwright.frame.EquilibriumSolver;
import org.mastwright.frame.VibrationSolver;
import org.mastwright.loads.LoadCase;
import org.mastwright.loads.PretensionState;

/** Natural frequencies of the tower in still air, as it is and as it could be. */
public final class ModeFinder {
  private static final double HEAD_BAND = 0.10;

  private final MastModel model;

  public ModeFinder(MastModel model) {
    this.model = model;
  }

  /**
   * A mode of the tower.
   *
   * @param hubFactor level movement of the mast top at unit modal mass
   * @param twistFactor twist of the mast top times a metre at unit modal mass
   * @param shape movements east, north and twist from foot to top at unit modal mass
   */
  public record TowerMode(
      double frequency_Hz,
      double hubFactor,
      double twistFactor,
      double bearing_rad,
      List<Vector3> shape) {
    public TowerMode {
      shape = List.copyOf(shape);
    }

    /** Whether the mast mostly twists. */
    public boolean isTorsion() {
      return twistFactor > 3 * hubFactor;
    }
  }

  /** Modes of one state of the tower. */
  public record State(String name, List<TowerMode> modes, boolean complete) {
    public State {
      modes = List.copyOf(modes);
    }
  }

  /** Height above the datum of each point of a shape. */
  public List<Double> heights_m() {
    List<Double> all = new ArrayList<>();
    for (int i = 0; i < model.mesh().nodes(); i++) {
      all.add(model.design().tower().footLevel_m() + model.mesh().along_m(i));
    }
    return all;
  }

  /** How many natural frequencies in still air lie below one. */
  public int countBelow(double frequency_Hz) {
    return VibrationSolver.countBelow(
        model.stillAir(PretensionState.NOMINAL),
        frequency_Hz,
        VibrationSolver.CableMass.THIRD_AT_NODE);
  }

  /**
   * Still air as described, then guys loose and taut, ropes soft and stiff where their modulus was
   * taken from their kind, head 10 % lighter and heavier, foot half and twice as stiff where it is
   * a spring, and the tower leaning under each running load given (a guy on its slack side is a
   * softer spring).
   */
  public List<State> states(int count, List<LoadCase> running) {
    List<Supplier<State>> all = new ArrayList<>();
    all.add(() -> state("still-air", model.stillAir(PretensionState.NOMINAL), count));
    if (model.guys().size() > 0) {
      all.add(() -> state("loose guys", model.stillAir(PretensionState.LOW), count));
      all.add(() -> state("taut guys", model.stillAir(PretensionState.HIGH), count));
    }
    if (model.ropesAreBanded()) {
      for (int sign : new int[] {-1, 1}) {
        all.add(
            () ->
                state(
                    sign < 0 ? "soft ropes" : "stiff ropes",
                    model.withRopes(sign).stillAir(PretensionState.NOMINAL),
                    count));
      }
    }
    all.add(() -> varied("lighter head", 1 - HEAD_BAND, 1, count));
    all.add(() -> varied("heavier head", 1 + HEAD_BAND, 1, count));
    if (model.design().tower().base() instanceof Tower.BaseSupport.Sprung) {
      all.add(() -> varied("softer foot", 1, 0.5, count));
      all.add(() -> varied("stiffer foot", 1, 2, count));
    }
    for (LoadCase loads : running) {
      all.add(() -> underWind(loads, count));
    }
    State[] found = new State[all.size()];
    IntStream.range(0, found.length).parallel().forEach(i -> found[i] = all.get(i).get());
    return List.of(found);
  }

  /** About the balance under a running load; without one the tower fails elsewhere. */
  private State underWind(LoadCase loads, int count) {
    try {
      Equilibrium balance =
          EquilibriumSolver.solve(model.chainFor(loads), new LoadMapping(model, loads).chainLoad());
      return state(loads.mark().id(), balance, count);
    } catch (EquilibriumException none) {
      return new State(loads.mark().id(), List.of(), true);
    }
  }

  private State varied(String name, double headFactor, double footFactor, int count) {
    Chain.Base base = MastModel.baseOf(model.design().tower().base());
    if (footFactor != 1) {
      base = Chain.Base.sprung(base.spring_Nmprad() * footFactor);
    }
    Vector3 centre =
        model
            .design()
            .turbine()
            .map(t -> new Vector3(0, t.head().centreAhead_m(), t.head().centreAboveTop_m()))
            .orElse(Vector3.ZERO);
    Chain chain =
        Pretension.with(
            model.bare(1, centre, headFactor, base),
            model.guys(),
            model.unstretched_m(PretensionState.NOMINAL));
    return state(name, EquilibriumSolver.solve(chain, ChainLoad.weightOnly()), count);
  }

  private static State state(String name, Equilibrium balance, int count) {
    if (!balance.isStable()) {
      return new State(name, List.of(), true);
    }
    VibrationSolver.Modes found =
        VibrationSolver.modes(balance, count, VibrationSolver.CableMass.THIRD_AT_NODE);
    return new State(name, found.modes().stream().map(ModeFinder::mode).toList(), found.complete());
  }

  static TowerMode mode(VibrationSolver.Mode m) {
    int last = m.movementComponents().size() - 1;
    ChainLoad.Components top = m.movementComponents().get(last);
    List<Vector3> shape = new ArrayList<>();
    for (int i = 0; i <= last; i++) {
      ChainLoad.Components u = m.movementComponents().get(i);
      shape.add(new Vector3(u.x(), u.y(), m.spinComponents().get(i).z()));
    }
    double bearing = greatestBearing(shape);
    return new TowerMode(
        m.frequency_Hz(),
        Math.hypot(top.x(), top.y()),
        Math.abs(m.spinComponents().get(last).z()),
        bearing,
        shape);
  }

  /** Bearing of the greatest level movement, 0 to 180°. */
  private static double greatestBearing(List<Vector3> shape) {
    Vector3 most = Vector3.ZERO;
    for (Vector3 v : shape) {
      most = v.level() > most.level() ? v : most;
    }
    return most.bearing_rad() % Math.PI;
  }

  /** Second method: Rayleigh's quotient of the shape bent by a small level force at the top. */
  public double rayleigh_Hz(double bearing_rad) {
    Equilibrium still = model.stillAir(PretensionState.NOMINAL);
    int last = model.mesh().nodes() - 1;
    Vector3 f = Vector3.towards(bearing_rad, 1);
    ChainLoad push =
        ChainLoad.weightOnly()
            .withVariable(
                new ChainLoad.Part(
                    List.of(
                        new ChainLoad.NodeLoad(
                            last,
                            new Chain.Point(0, 0, 0),
                            new ChainLoad.Components(f.east(), f.north(), 0),
                            new ChainLoad.Components(0, 0, 0))),
                    List.of(),
                    List.of()));
    Equilibrium bent = EquilibriumSolver.solve(still.chain(), push);
    List<ChainLoad.Components> moved = new ArrayList<>();
    List<ChainLoad.Components> turned = new ArrayList<>();
    for (int i = 0; i <= last; i++) {
      Chain.Point a = bent.movement_m(i);
      Chain.Point b = still.movement_m(i);
      moved.add(new ChainLoad.Components(a.x_m() - b.x_m(), a.y_m() - b.y_m(), a.z_m() - b.z_m()));
      ChainLoad.Components p = bent.rotation_rad(i);
      ChainLoad.Components q = still.rotation_rad(i);
      turned.add(new ChainLoad.Components(p.x() - q.x(), p.y() - q.y(), p.z() - q.z()));
    }
    return VibrationSolver.rayleigh_Hz(
        still, moved, turned, VibrationSolver.CableMass.THIRD_AT_NODE);
  }
}
