package org.mastwright.mast;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.mastwright.design.Design;
import org.mastwright.forces.BaseReaction;
import org.mastwright.forces.CaseMark;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.Response;
import org.mastwright.forces.SectionForces;
import org.mastwright.forces.TopMovement;
import org.mastwright.forces.Vector3;
import org.mastwright.frame.Chain;
import org.mastwright.frame.ChainLoad;
import org.mastwright.frame.Equilibrium;

/** What an equilibrium of the chain says about the tower. */
final class Recovery {
  /** A guy is slack below this share of its level pull in still air. */
  private static final double SLACK_FRACTION = 0.10;

  private final Design design;
  private final Mesh mesh;
  private final GuyPlaces guys;
  private final CaseMark mark;
  private final Equilibrium stillAir;

  Recovery(Design design, Mesh mesh, GuyPlaces guys, CaseMark mark, Equilibrium stillAir) {
    this.design = design;
    this.mesh = mesh;
    this.guys = guys;
    this.mark = mark;
    this.stillAir = stillAir;
  }

  Response response(
      Equilibrium e, boolean converged, double reached, Optional<Response.LimitPoint> limit) {
    return new Response(
        mark,
        stations(e),
        guyForces(e),
        base(e),
        top(e),
        e.residualRatio(),
        e.iterations(),
        converged,
        reached,
        limit);
  }

  private List<SectionForces> stations(Equilibrium e) {
    List<SectionForces> all = new ArrayList<>();
    for (int i = 0; i < mesh.nodes() - 1; i++) {
      all.add(station(e, i, e.lowerEnd(i)));
      all.add(station(e, i + 1, e.upperEnd(i)));
    }
    return all;
  }

  private SectionForces station(Equilibrium e, int node, Equilibrium.BeamEnd end) {
    ChainLoad.Components shear = end.shear_N();
    ChainLoad.Components bending = end.bending_Nm();
    Chain.Point place = e.place_m(node);
    double along_m = mesh.along_m(node);
    return new SectionForces(
        along_m,
        design.tower().footLevel_m() + along_m,
        end.axial_N(),
        shear.x(),
        shear.y(),
        bending.x(),
        bending.y(),
        end.torque_Nm(),
        place.x_m(),
        place.y_m());
  }

  private List<GuyForces> guyForces(Equilibrium e) {
    List<GuyForces> all = new ArrayList<>();
    for (int i = 0; i < guys.size(); i++) {
      GuyPlaces.Place g = guys.all().get(i);
      double still_N =
          stillAir
              .cable(i)
              .map(c -> Math.hypot(c.anchorPull_N().x(), c.anchorPull_N().y()))
              .orElse(0.0);
      all.add(guy(g, e.cable(i), still_N));
    }
    return all;
  }

  private static GuyForces guy(
      GuyPlaces.Place g, Optional<Equilibrium.CableForces> cable, double still_N) {
    int anchor = g.set().guys().get(g.index()).anchor();
    if (cable.isEmpty()) {
      return new GuyForces(
          g.set().number(),
          g.index(),
          g.azimuth_rad(),
          anchor,
          0,
          0,
          Vector3.ZERO,
          still_N,
          false,
          true,
          List.of());
    }
    Equilibrium.CableForces c = cable.get();
    Vector3 pull = new Vector3(c.anchorPull_N().x(), c.anchorPull_N().y(), c.anchorPull_N().z());
    return new GuyForces(
        g.set().number(),
        g.index(),
        g.azimuth_rad(),
        anchor,
        c.nodeTension_N(),
        c.anchorTension_N(),
        pull,
        still_N,
        pull.level() < SLACK_FRACTION * still_N,
        false,
        c.shape_m().stream().map(p -> new Vector3(p.x_m(), p.y_m(), p.z_m())).toList());
  }

  private static BaseReaction base(Equilibrium e) {
    ChainLoad.Components f = e.baseForce_N();
    ChainLoad.Components m = e.baseMoment_Nm();
    return new BaseReaction(f.x(), f.y(), f.z(), m.x(), m.y(), m.z());
  }

  private TopMovement top(Equilibrium e) {
    int last = mesh.nodes() - 1;
    Chain.Point place = e.place_m(last);
    double height_m = design.tower().topHeight_m();
    Chain.Point axis = e.turned_m(last, new Chain.Point(0, 0, 1));
    ChainLoad.Components turn = e.rotation_rad(last);
    double level = Math.hypot(axis.x_m(), axis.y_m());
    double towards = Math.atan2(axis.x_m(), axis.y_m());
    return new TopMovement(
        place.x_m(),
        place.y_m(),
        place.z_m() - height_m,
        Math.atan2(level, axis.z_m()),
        towards < 0 ? towards + 2 * Math.PI : towards,
        turn.z());
  }
}
