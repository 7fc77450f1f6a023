package org.mastwright.mast;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.Basis;
import org.mastwright.design.Design;
import org.mastwright.design.GuySet;
import org.mastwright.design.Tower;
import org.mastwright.design.Turbine;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.forces.Vector3;
import org.mastwright.frame.BucklingSolver;
import org.mastwright.frame.Chain;
import org.mastwright.frame.ChainLoad;
import org.mastwright.frame.Equilibrium;
import org.mastwright.frame.EquilibriumException;
import org.mastwright.frame.EquilibriumSolver;
import org.mastwright.frame.LimitPointSearch;
import org.mastwright.loads.LoadCase;
import org.mastwright.loads.PretensionState;
import org.mastwright.working.AnalysisException;

/**
 * A tower as a chain, its guys set for every state of pretension. Immutable; any thread may use it.
 */
public final class MastModel {
  static final double GRAVITY_MPS2 = 9.80665;

  /** AISC 360 C2.3: stiffness in strength runs; τb is 1 for the axial forces of such masts. */
  private static final double AISC_STIFFNESS_FACTOR = 0.8;

  private static final double LIMIT_TOLERANCE = 0.01;

  /** Where a case has no balance, how near its last one is found. */
  private static final double COARSE_TOLERANCE = 0.1;

  /** One go at the whole load; what does not settle then goes to the limit-point search. */
  private static final EquilibriumSolver.Options ONE_GO =
      new EquilibriumSolver.Options(1e-10, 15, 1, 3);

  private final Design design;
  private final Mesh mesh;
  private final GuyPlaces guys;
  private final Map<PretensionState, double[]> unstretched_m = new EnumMap<>(PretensionState.class);
  private final Map<PretensionState, Equilibrium> stillAir = new EnumMap<>(PretensionState.class);

  private MastModel(Design design, List<PretensionState> states) {
    this.design = design;
    this.mesh = Mesh.usual(design.tower());
    this.guys = new GuyPlaces(design, mesh);
    Chain bare = bare(1, headCentre());
    for (PretensionState state : states) {
      double[] lengths = guys.size() == 0 ? new double[0] : set(bare, guys, state);
      unstretched_m.put(state, lengths);
      stillAir.put(state, still(Pretension.with(bare, guys, lengths)));
    }
  }

  /** Sets the guys; what cannot be set is told in a sentence. */
  static double[] set(Chain bare, GuyPlaces guys, PretensionState state) {
    try {
      return Pretension.unstretched_m(bare, guys, state);
    } catch (EquilibriumException lost) {
      throw new AnalysisException(
          "The guys cannot be set ("
              + state.name().toLowerCase(java.util.Locale.ROOT)
              + " tension): "
              + lost.getMessage()
              + ". Likely: a tension below what the guy's own weight gives, or a wrong unit.",
          lost);
    }
  }

  /**
   * Sets the guys and finds the mast in still air.
   *
   * @throws AnalysisException when there is no equilibrium in still air, with the likely cause
   */
  public static MastModel of(Design design) {
    return new MastModel(design, List.of(PretensionState.values()));
  }

  /**
   * The same tower with ropes whose modulus lies at one end of its band, set to the nominal tension
   * only.
   *
   * @param sign +1 for the stiff end of the band, -1 for the soft one
   */
  MastModel withRopes(int sign) {
    Tower t = design.tower();
    List<GuySet> sets = t.guys().stream().map(g -> g.withModulusAt(sign)).toList();
    return new MastModel(design.withTower(t.withGuys(sets)), List.of(PretensionState.NOMINAL));
  }

  /** Whether the modulus of any rope was taken from its kind. */
  boolean ropesAreBanded() {
    return design.tower().guys().stream().anyMatch(g -> g.rope().modulusBandFraction() > 0);
  }

  private static Equilibrium still(Chain chain) {
    try {
      return EquilibriumSolver.solve(chain, ChainLoad.weightOnly());
    } catch (EquilibriumException lost) {
      throw new AnalysisException(
          "No equilibrium in still air: "
              + lost.getMessage()
              + ". Likely: "
              + (lost.likely() == EquilibriumException.Cause.MECHANISM
                  ? "a mechanism, such as a pinned foot with guys that do not hold every direction,"
                      + " or a mast that buckles under its own weight."
                  : "guys without tension or a mast that cannot carry its own weight."),
          lost);
    }
  }

  Design design() {
    return design;
  }

  Mesh mesh() {
    return mesh;
  }

  GuyPlaces guys() {
    return guys;
  }

  /** The head facing north, as in still air. */
  private Vector3 headCentre() {
    return design
        .turbine()
        .map(t -> new Vector3(0, t.head().centreAhead_m(), t.head().centreAboveTop_m()))
        .orElse(Vector3.ZERO);
  }

  /** Straight chain with head and objects, without guys. */
  Chain bare(double stiffnessFactor, Vector3 headCentre) {
    return bare(stiffnessFactor, headCentre, 1, baseOf(design.tower().base()));
  }

  Chain bare(double stiffnessFactor, Vector3 headCentre, double headMassFactor, Chain.Base base) {
    List<Chain.Point> nodes = new ArrayList<>();
    for (int i = 0; i < mesh.nodes(); i++) {
      nodes.add(new Chain.Point(0, 0, design.tower().footLevel_m() + mesh.along_m(i)));
    }
    List<Chain.Body> bodies = new ArrayList<>(mesh.objects());
    design.turbine().ifPresent(t -> bodies.add(head(t, headCentre, headMassFactor)));
    return new Chain(
        nodes, mesh.beams(stiffnessFactor, true, 0), List.of(), bodies, base, GRAVITY_MPS2);
  }

  private Chain.Body head(Turbine turbine, Vector3 centre, double massFactor) {
    Turbine.Head head = turbine.head();
    double across = head.inertiaTransverse_kgm2() * massFactor;
    return new Chain.Body(
        mesh.nodes() - 1,
        turbine.mass_kg() * massFactor,
        new Chain.Point(centre.east(), centre.north(), centre.up()),
        new Chain.Inertia(across, across, head.inertiaAboutTowerAxis_kgm2() * massFactor));
  }

  static Chain.Base baseOf(Tower.BaseSupport base) {
    if (base instanceof Tower.BaseSupport.Fixed) {
      return Chain.Base.clamped();
    }
    if (base instanceof Tower.BaseSupport.Hinged h) {
      return Chain.Base.hinged(h.axisBearing_rad());
    }
    if (base instanceof Tower.BaseSupport.Sprung s) {
      return Chain.Base.sprung(s.stiffness_Nmprad());
    }
    return Chain.Base.pinned();
  }

  double[] unstretched_m(PretensionState state) {
    return unstretched_m.get(state);
  }

  /** The mast in still air, head to the north. */
  Equilibrium stillAir(PretensionState state) {
    return stillAir.get(state);
  }

  /** The chain a case acts on: head turned, axis off true by the imperfections of its kind. */
  Chain chainFor(LoadCase loads) {
    boolean strength = loads.mark().limitState() == LimitState.STRENGTH;
    Basis.StrengthBasis basis =
        design.basis().map(Basis::strength).orElse(Basis.StrengthBasis.EN_1993);
    boolean aisc = strength && basis != Basis.StrengthBasis.EN_1993;
    Chain chain = bare(aisc ? AISC_STIFFNESS_FACTOR : 1, loads.headCentre_m());
    if (loads.iceOnHead_kg() > 0) {
      List<Chain.Body> bodies = new ArrayList<>(chain.bodies());
      Vector3 c = loads.headCentre_m();
      bodies.add(
          new Chain.Body(
              mesh.nodes() - 1,
              loads.iceOnHead_kg(),
              new Chain.Point(c.east(), c.north(), c.up()),
              new Chain.Inertia(0, 0, 0)));
      chain = chain.withBodies(bodies);
    }
    chain = Pretension.with(chain, guys, unstretched_m.get(loads.pretension()));
    return strength ? lean(chain, loads.mark().windFrom_rad(), basis) : chain;
  }

  private Chain lean(Chain chain, double windFrom_rad, Basis.StrengthBasis basis) {
    List<Double> offsets = Imperfection.offsets_m(design.tower(), mesh, basis);
    List<Chain.Point> nodes = new ArrayList<>();
    for (int i = 0; i < offsets.size(); i++) {
      Chain.Point p = chain.nodes().get(i);
      nodes.add(
          new Chain.Point(
              p.x_m() - offsets.get(i) * Math.sin(windFrom_rad),
              p.y_m() - offsets.get(i) * Math.cos(windFrom_rad),
              p.z_m()));
    }
    return chain.withNodes(nodes);
  }

  /**
   * The tower under a load case. Without an equilibrium under the full loads the response is the
   * last one found, marked so.
   *
   * @throws AnalysisException when there is none under the permanent loads alone
   */
  public Response solve(LoadCase loads) {
    Chain chain = chainFor(loads);
    ChainLoad load = new LoadMapping(this, loads).chainLoad();
    Optional<Equilibrium> direct =
        EquilibriumSolver.near(chain, load, stillAir.get(loads.pretension()), ONE_GO);
    if (direct.isPresent()) {
      return recovery(loads).response(direct.get(), true, 1, Optional.empty());
    }
    LimitPointSearch.Result found = search(loads, chain, load, 1, 0.5, COARSE_TOLERANCE);
    return found.whole().isPresent()
        ? recovery(loads).response(found.whole().get(), true, 1, Optional.empty())
        : lost(loads, found);
  }

  /** The same with the factor on the variable loads at which the equilibrium is lost. */
  public Response solveWithLimit(LoadCase loads, double capFactor) {
    Chain chain = chainFor(loads);
    ChainLoad load = new LoadMapping(this, loads).chainLoad();
    LimitPointSearch.Result found = search(loads, chain, load, capFactor, 1, LIMIT_TOLERANCE);
    return found.whole().isPresent()
        ? recovery(loads).response(found.whole().get(), true, 1, Optional.of(limit(found)))
        : lost(loads, found);
  }

  private Response lost(LoadCase loads, LimitPointSearch.Result found) {
    return recovery(loads).response(found.last(), false, found.factor(), Optional.of(limit(found)));
  }

  private static Response.LimitPoint limit(LimitPointSearch.Result found) {
    return new Response.LimitPoint(found.factor(), found.lost());
  }

  private LimitPointSearch.Result search(
      LoadCase loads,
      Chain chain,
      ChainLoad load,
      double capFactor,
      double firstStep,
      double tolerance) {
    try {
      return LimitPointSearch.search(
          chain, load, stillAir.get(loads.pretension()), capFactor, firstStep, tolerance);
    } catch (EquilibriumException lost) {
      throw new AnalysisException(
          loads.mark().id()
              + ": no equilibrium under the permanent loads: "
              + lost.getMessage()
              + ". Likely: guys too slack to hold the mast, or a mast that buckles under its weight.",
          lost);
    }
  }

  private Recovery recovery(LoadCase loads) {
    return new Recovery(design, mesh, guys, loads.mark(), stillAir.get(loads.pretension()));
  }

  /** Linear buckling factor of a case: information, not a proof. */
  public double bucklingFactor(LoadCase loads) {
    Chain chain = chainFor(loads);
    ChainLoad load = new LoadMapping(this, loads).chainLoad();
    try {
      Equilibrium e = EquilibriumSolver.solve(chain, load);
      return BucklingSolver.criticalFactor(e);
    } catch (EquilibriumException lost) {
      return 0;
    }
  }

  /** Tension at the anchor of a guy in still air; empty when there is no such guy. */
  public OptionalDouble stillAirTension_N(PretensionState state, int set, int index) {
    int i = guys.indexOf(set, index);
    return i < 0
        ? OptionalDouble.empty()
        : OptionalDouble.of(stillAir.get(state).cable(i).orElseThrow().anchorTension_N());
  }
}
