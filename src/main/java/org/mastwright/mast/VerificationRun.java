package org.mastwright.mast;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.mastwright.design.Design;
import org.mastwright.design.Verification;
import org.mastwright.forces.CaseMark;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.forces.Vector3;
import org.mastwright.frame.BucklingSolver;
import org.mastwright.frame.Chain;
import org.mastwright.frame.ChainLoad;
import org.mastwright.frame.Equilibrium;
import org.mastwright.frame.EquilibriumException;
import org.mastwright.frame.EquilibriumSolver;
import org.mastwright.frame.VibrationSolver;
import org.mastwright.loads.LoadCase;
import org.mastwright.loads.PretensionState;
import org.mastwright.working.AnalysisException;

/**
 * Solves the direct cases of a verification file: no partial factors, no imperfections.
 *
 * @param modes about still air first, then about each case
 * @param buckling linear factor of each case, in the order of the cases
 */
public record VerificationRun(
    List<Response> responses,
    List<ModeFinder.State> modes,
    List<Double> bucklingFactor,
    List<Double> heights_m) {
  public VerificationRun {
    responses = List.copyOf(responses);
    modes = List.copyOf(modes);
    bucklingFactor = List.copyOf(bucklingFactor);
    heights_m = List.copyOf(heights_m);
  }

  /** Runs all cases of a design with a verification section. */
  public static VerificationRun run(Design design) {
    Verification v = design.verification().orElseThrow();
    Mesh mesh =
        v.elementsPerTube().isPresent()
            ? Mesh.perTube(design.tower(), v.elementsPerTube().getAsInt())
            : Mesh.usual(design.tower());
    GuyPlaces guys = new GuyPlaces(design, mesh);
    Chain bare = bare(design, v, mesh);
    double[] lengths =
        guys.size() == 0 ? new double[0] : MastModel.set(bare, guys, PretensionState.NOMINAL);
    Chain chain = Pretension.with(bare, guys, lengths);
    VibrationSolver.CableMass mass =
        v.guyInertia() ? VibrationSolver.CableMass.SWINGING : VibrationSolver.CableMass.NONE;
    Equilibrium still = solve("still air", chain, ChainLoad.weightOnly());
    List<Response> responses = new ArrayList<>();
    List<ModeFinder.State> modes = new ArrayList<>();
    List<Double> buckling = new ArrayList<>();
    modes.add(state("still-air", still, v.modes(), mass));
    for (Verification.DirectCase c : v.cases()) {
      LoadCase loads = loads(design, v, mesh, guys, c);
      Equilibrium e = solve(c.id(), chain, new LoadMapping(mesh, guys, loads).chainLoad());
      responses.add(
          new Recovery(design, mesh, guys, loads.mark(), still)
              .response(e, true, 1, Optional.empty()));
      modes.add(state(c.id(), e, v.modes(), mass));
      buckling.add(BucklingSolver.criticalFactor(e));
    }
    List<Double> heights = new ArrayList<>();
    for (int i = 0; i < mesh.nodes(); i++) {
      heights.add(design.tower().footLevel_m() + mesh.along_m(i));
    }
    return new VerificationRun(responses, modes, buckling, heights);
  }

  private static Equilibrium solve(String id, Chain chain, ChainLoad load) {
    try {
      return EquilibriumSolver.solve(chain, load);
    } catch (EquilibriumException lost) {
      throw new AnalysisException(
          id
              + ": no equilibrium: "
              + lost.getMessage()
              + ". Likely: a mechanism, too little pretension, or loads past the limit point.",
          lost);
    }
  }

  private static ModeFinder.State state(
      String name, Equilibrium e, int count, VibrationSolver.CableMass mass) {
    VibrationSolver.Modes found = VibrationSolver.modes(e, count, mass);
    return new ModeFinder.State(
        name, found.modes().stream().map(ModeFinder::mode).toList(), found.complete());
  }

  private static Chain bare(Design design, Verification v, Mesh mesh) {
    List<Chain.Point> nodes = new ArrayList<>();
    for (int i = 0; i < mesh.nodes(); i++) {
      nodes.add(new Chain.Point(0, 0, design.tower().footLevel_m() + mesh.along_m(i)));
    }
    List<Chain.Body> bodies = new ArrayList<>(mesh.objects());
    for (Verification.PointMass m : v.masses()) {
      bodies.add(
          Chain.Body.point(mesh.nodeAt(m.along_m() - design.tower().footLevel_m()), m.mass_kg()));
    }
    v.head()
        .ifPresent(
            h ->
                bodies.add(
                    new Chain.Body(
                        mesh.nodes() - 1,
                        h.mass_kg(),
                        new Chain.Point(h.centre().east(), h.centre().north(), h.centre().up()),
                        new Chain.Inertia(
                            h.inertia().east(), h.inertia().north(), h.inertia().up()))));
    return new Chain(
        nodes,
        mesh.beams(1, v.shearFlexible(), v.mastAddedMass_kgpm()),
        List.of(),
        bodies,
        MastModel.baseOf(design.tower().base()),
        v.gravity_mps2());
  }

  private static Vector3 vector(Verification.Vector v) {
    return new Vector3(v.east(), v.north(), v.up());
  }

  private static LoadCase loads(
      Design design, Verification v, Mesh mesh, GuyPlaces guys, Verification.DirectCase c) {
    double foot = design.tower().footLevel_m();
    List<LoadCase.PointLoad> points = new ArrayList<>();
    for (Verification.DirectForce f : c.forces()) {
      points.add(
          new LoadCase.PointLoad(
              "force", f.along_m() - foot, vector(f.offset()), vector(f.force()), Vector3.ZERO));
    }
    for (Verification.DirectMoment m : c.moments()) {
      points.add(
          new LoadCase.PointLoad(
              "moment", m.along_m() - foot, Vector3.ZERO, Vector3.ZERO, vector(m.moment())));
    }
    List<LoadCase.MastLoad> lines = new ArrayList<>();
    for (Verification.LineLoad l : c.mastLineLoads()) {
      lines.add(
          new LoadCase.MastLoad(
              "line load",
              l.bottom_m() - foot,
              l.top_m() - foot,
              vector(l.bottom()),
              vector(l.top())));
    }
    List<LoadCase.GuyLoad> guyLoads = new ArrayList<>();
    for (Verification.GuyLoad g : c.guyLineLoads()) {
      for (GuyPlaces.Place p : guys.all()) {
        boolean set = g.set().isEmpty() || g.set().getAsInt() == p.set().number();
        boolean at = g.azimuth_rad().isEmpty() || same(g.azimuth_rad().get(), p.azimuth_rad());
        if (set && at) {
          guyLoads.add(
              new LoadCase.GuyLoad(
                  new LoadCase.GuyPlace(p.set().number(), p.index()), List.of(vector(g.load()))));
        }
      }
    }
    List<LoadCase.MastMass> ice = new ArrayList<>();
    for (Verification.LineMass m : c.mastLineMasses()) {
      ice.add(new LoadCase.MastMass(m.bottom_m() - foot, m.top_m() - foot, m.mass_kgpm()));
    }
    List<LoadCase.GuyPlace> gone = new ArrayList<>();
    for (Verification.RemovedGuy r : c.guysRemoved()) {
      for (GuyPlaces.Place p : guys.all()) {
        if (p.set().number() == r.set() && same(r.azimuth_rad(), p.azimuth_rad())) {
          gone.add(new LoadCase.GuyPlace(r.set(), p.index()));
        }
      }
    }
    CaseMark mark =
        new CaseMark(c.id(), c.id(), c.id(), "verification", LimitState.VERIFICATION, 0, 0, false);
    return new LoadCase(
        mark,
        PretensionState.NOMINAL,
        1,
        c.temperatureChange_K(),
        Vector3.ZERO,
        points,
        lines,
        guyLoads,
        ice,
        List.of(),
        0,
        1,
        gone);
  }

  private static boolean same(double a_rad, double b_rad) {
    double apart = Math.abs(a_rad - b_rad) % (2 * Math.PI);
    return Math.min(apart, 2 * Math.PI - apart) < 1e-3;
  }
}
