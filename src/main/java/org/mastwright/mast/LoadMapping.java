package org.mastwright.mast;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.mastwright.design.GuySet;
import org.mastwright.forces.Vector3;
import org.mastwright.frame.Chain;
import org.mastwright.frame.ChainLoad;
import org.mastwright.loads.LoadCase;

/** A load case as loads on nodes, beams and cables. */
final class LoadMapping {
  private final Mesh mesh;
  private final GuyPlaces guys;
  private final LoadCase loads;

  LoadMapping(MastModel model, LoadCase loads) {
    this(model.mesh(), model.guys(), loads);
  }

  LoadMapping(Mesh mesh, GuyPlaces guys, LoadCase loads) {
    this.mesh = mesh;
    this.guys = guys;
    this.loads = loads;
  }

  ChainLoad chainLoad() {
    ChainLoad.Part variable = new ChainLoad.Part(nodeLoads(), beamLoads(), cableLoads());
    return new ChainLoad(
        loads.gravityFactor(),
        loads.guyTemperatureChange_K(),
        removed(),
        ice(),
        ChainLoad.Part.NONE,
        variable);
  }

  private static ChainLoad.Components components(Vector3 v) {
    return new ChainLoad.Components(v.east(), v.north(), v.up());
  }

  private List<ChainLoad.NodeLoad> nodeLoads() {
    List<ChainLoad.NodeLoad> all = new ArrayList<>();
    for (LoadCase.PointLoad p : loads.head()) {
      all.add(
          new ChainLoad.NodeLoad(
              mesh.nodeAt(p.along_m()),
              new Chain.Point(p.offset_m().east(), p.offset_m().north(), p.offset_m().up()),
              components(p.force_N()),
              components(p.moment_Nm())));
    }
    return all;
  }

  /** Each load on each beam it covers; where it covers part of one, the force is kept. */
  private List<ChainLoad.BeamLoad> beamLoads() {
    List<ChainLoad.BeamLoad> all = new ArrayList<>();
    for (int i = 0; i < mesh.nodes() - 1; i++) {
      double from = mesh.along_m(i);
      double to = mesh.along_m(i + 1);
      Vector3 lower = Vector3.ZERO;
      Vector3 upper = Vector3.ZERO;
      for (LoadCase.MastLoad m : loads.mast()) {
        double a = Math.max(from, m.bottom_m());
        double b = Math.min(to, m.top_m());
        if (b - a > 1e-9) {
          double share = (b - a) / (to - from);
          lower = lower.plus(at(m, a).times(share));
          upper = upper.plus(at(m, b).times(share));
        }
      }
      if (lower.length() > 0 || upper.length() > 0) {
        all.add(new ChainLoad.BeamLoad(i, components(lower), components(upper)));
      }
    }
    return all;
  }

  private static Vector3 at(LoadCase.MastLoad m, double along_m) {
    double t = (along_m - m.bottom_m()) / (m.top_m() - m.bottom_m());
    return m.bottom_Npm().plus(m.top_Npm().minus(m.bottom_Npm()).times(t));
  }

  private List<ChainLoad.CableLoad> cableLoads() {
    List<ChainLoad.CableLoad> all = new ArrayList<>();
    for (LoadCase.GuyLoad g : loads.guys()) {
      int cable = guys.indexOf(g.guy().set(), g.guy().index());
      GuySet set = guys.all().get(cable).set();
      double ice = loads.guyIce_kgpm().isEmpty() ? 0 : loads.guyIce_kgpm().get(set.number() - 1);
      double weight = ice * MastModel.GRAVITY_MPS2 * loads.iceFactor();
      List<ChainLoad.Components> parts =
          g.parts_Npm().stream().map(v -> components(v.plus(new Vector3(0, 0, -weight)))).toList();
      all.add(new ChainLoad.CableLoad(cable, parts, ice));
    }
    return all;
  }

  private List<ChainLoad.AddedMass> ice() {
    List<ChainLoad.AddedMass> all = new ArrayList<>();
    for (LoadCase.MastMass m : loads.ice()) {
      for (int i = 0; i < mesh.nodes() - 1; i++) {
        double over =
            Math.min(m.top_m(), mesh.along_m(i + 1)) - Math.max(m.bottom_m(), mesh.along_m(i));
        if (over > 1e-9) {
          double share = over / (mesh.along_m(i + 1) - mesh.along_m(i));
          all.add(new ChainLoad.AddedMass(i, m.mass_kgpm() * share, loads.iceFactor()));
        }
      }
    }
    return all;
  }

  private List<Boolean> removed() {
    Boolean[] gone = new Boolean[guys.size()];
    Arrays.fill(gone, false);
    for (LoadCase.GuyPlace p : loads.removed()) {
      gone[guys.indexOf(p.set(), p.index())] = true;
    }
    return List.of(gone);
  }
}
