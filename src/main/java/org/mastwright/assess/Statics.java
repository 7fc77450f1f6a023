package org.mastwright.assess;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.design.Design;
import org.mastwright.design.GuySet;
import org.mastwright.design.Tower;
import org.mastwright.design.Tube;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.Response;
import org.mastwright.forces.SectionForces;
import org.mastwright.forces.TopMovement;
import org.mastwright.forces.Vector3;
import org.mastwright.loads.LoadCase;

/**
 * A solved case as a free body: every force on it at the place it has moved to. A second method
 * that uses nothing of the beam calculation but the deformed shape, the guys' pulls and the
 * reactions.
 */
final class Statics {
  private static final double GRAVITY_MPS2 = 9.80665;

  /** A force with the place it acts at and how far along the mast it belongs; −1 for the guys. */
  private record Force(double along_m, Vector3 place_m, Vector3 force_N) {}

  private final Design design;
  private final LoadCase loads;
  private final Response response;
  private final List<Force> forces = new ArrayList<>();
  private Vector3 freeMoment_Nm = Vector3.ZERO;
  private Vector3 onGuys_N = Vector3.ZERO;

  private Statics(Design design, SolvedCase solved) {
    this.design = design;
    this.loads = solved.loads();
    this.response = solved.response();
    addHead();
    addMastLoads();
    addWeight();
    addGuys();
  }

  static Statics of(Design design, SolvedCase solved) {
    return new Statics(design, solved);
  }

  /**
   * Sum of all forces on mast and guys with the reactions of foot and anchors, over the greatest
   * single force.
   */
  double forceImbalanceRatio() {
    Vector3 sum =
        new Vector3(response.base().east_N(), response.base().north_N(), response.base().up_N());
    double greatest_N = sum.length();
    for (Force f : forces) {
      sum = sum.plus(f.force_N);
      greatest_N = Math.max(greatest_N, f.force_N.length());
    }
    return sum.length() / greatest_N;
  }

  /** Level force and vertical force on mast, head and guys together, without reactions. */
  Vector3 applied_N() {
    Vector3 sum = onGuys_N;
    for (Force f : forces) {
      if (f.along_m >= 0) {
        sum = sum.plus(f.force_N);
      }
    }
    return sum;
  }

  /** What the anchors and the foot take together. */
  Vector3 reactions_N() {
    Vector3 sum =
        new Vector3(response.base().east_N(), response.base().north_N(), response.base().up_N());
    for (GuyForces g : response.guys()) {
      sum = sum.minus(g.anchorPull_N());
    }
    return sum;
  }

  /** Bending moment in a section by taking moments of everything above it. */
  double momentAt_Nm(SectionForces section) {
    Vector3 centre = place(section.along_m());
    Vector3 moment = freeMoment_Nm;
    for (Force f : forces) {
      if (isAbove(f, section.along_m(), centre)) {
        moment = moment.plus(f.place_m.minus(centre).cross(f.force_N));
      }
    }
    Vector3 axis = tangent(section.along_m());
    return moment.minus(axis.times(moment.dot(axis))).length();
  }

  private static boolean isAbove(Force f, double along_m, Vector3 centre) {
    return f.along_m >= 0 ? f.along_m > along_m : f.place_m.up() > centre.up();
  }

  private void addHead() {
    for (LoadCase.PointLoad load : loads.head()) {
      Vector3 place = place(load.along_m()).plus(turned(load.offset_m()));
      forces.add(new Force(load.along_m(), place, load.force_N()));
      freeMoment_Nm = freeMoment_Nm.plus(load.moment_Nm());
    }
    design
        .turbine()
        .ifPresent(
            t -> {
              double top_m = design.tower().length_m();
              Vector3 place = place(top_m).plus(turned(loads.headCentre_m()));
              forces.add(new Force(top_m, place, weight(t.mass_kg())));
            });
  }

  private void addMastLoads() {
    for (LoadCase.MastLoad load : loads.mast()) {
      distribute(
          load.bottom_m(),
          load.top_m(),
          t -> load.bottom_Npm().plus(load.top_Npm().minus(load.bottom_Npm()).times(t)));
    }
  }

  private void addWeight() {
    Tower tower = design.tower();
    for (Tube tube : tower.tubes()) {
      distribute(tube.bottom_m(), tube.top_m(), t -> weight(massPerLength(tube, t)));
    }
    for (Tower.Attachment a : tower.attachments()) {
      if (a.top_m() > a.bottom_m()) {
        Vector3 perLength = weight(a.mass_kg() / (a.top_m() - a.bottom_m()));
        distribute(a.bottom_m(), a.top_m(), t -> perLength);
      } else {
        forces.add(new Force(a.bottom_m(), place(a.bottom_m()), weight(a.mass_kg())));
      }
    }
  }

  /** Mass per length shared out by the section's area where the tube tapers. */
  private static double massPerLength(Tube tube, double t) {
    if (!tube.isTapered()) {
      return tube.nominalMass_kgpm();
    }
    double mean =
        (tube.bottom().area_m2()
                + 4 * tube.sectionAt((tube.bottom_m() + tube.top_m()) / 2).area_m2()
                + tube.top().area_m2())
            / 6;
    double here = tube.sectionAt(tube.bottom_m() + t * tube.length_m()).area_m2();
    return tube.nominalMass_kgpm() * here / mean;
  }

  private Vector3 weight(double mass_kg) {
    return new Vector3(0, 0, -mass_kg * GRAVITY_MPS2 * loads.gravityFactor());
  }

  /** The guys' forces on the mast: each guy is in balance under pull, weight and wind. */
  private void addGuys() {
    for (GuyForces g : response.guys()) {
      if (g.removed()) {
        continue;
      }
      GuySet set = design.tower().guys().get(g.set() - 1);
      double length_m = unstretched(g, set);
      Vector3 own = weight(set.rope().mass_kgpm() * length_m);
      for (LoadCase.GuyLoad load : loads.guys()) {
        if (load.guy().set() == g.set() && load.guy().index() == g.index()) {
          double part_m = length_m / load.parts_Npm().size();
          for (Vector3 w : load.parts_Npm()) {
            own = own.plus(w.times(part_m));
          }
        }
      }
      Vector3 place = g.shape_m().get(g.shape_m().size() - 1);
      forces.add(new Force(-1, place, own.minus(g.anchorPull_N())));
      onGuys_N = onGuys_N.plus(own);
    }
  }

  private static double unstretched(GuyForces g, GuySet set) {
    double length_m = 0;
    for (int i = 1; i < g.shape_m().size(); i++) {
      length_m += g.shape_m().get(i).minus(g.shape_m().get(i - 1)).length();
    }
    double mean_N = (g.tensionAtMast_N() + g.tensionAtAnchor_N()) / 2;
    return length_m / (1 + mean_N / (set.rope().modulus_Pa() * set.rope().area_m2()));
  }

  /** A load per length as a function of the share of the way from bottom to top. */
  private interface PerLength {
    Vector3 at(double t);
  }

  /** Breaks a load per length into short pieces, each at the middle of its place. */
  private void distribute(double bottom_m, double top_m, PerLength load) {
    int pieces = Math.max(1, (int) Math.ceil((top_m - bottom_m) / 0.1));
    double piece_m = (top_m - bottom_m) / pieces;
    for (int i = 0; i < pieces; i++) {
      double t = (i + 0.5) / pieces;
      double along_m = bottom_m + t * (top_m - bottom_m);
      forces.add(new Force(along_m, place(along_m), load.at(t).times(piece_m)));
    }
  }

  /** Where a point of the axis has moved to. */
  private Vector3 place(double along_m) {
    List<SectionForces> s = response.stations();
    int i = 1;
    while (i < s.size() - 1 && s.get(i).along_m() < along_m) {
      i++;
    }
    SectionForces a = s.get(i - 1);
    SectionForces b = s.get(i);
    double length_m = b.along_m() - a.along_m();
    double t = length_m > 0 ? (along_m - a.along_m()) / length_m : 0;
    return new Vector3(
        a.east_m() + t * (b.east_m() - a.east_m()),
        a.north_m() + t * (b.north_m() - a.north_m()),
        design.tower().footLevel_m() + along_m);
  }

  private Vector3 tangent(double along_m) {
    double d = 0.05;
    double top_m = design.tower().length_m();
    double from = Math.max(0, along_m - d);
    double to = Math.min(top_m, along_m + d);
    Vector3 chord = place(to).minus(place(from));
    return chord.times(1 / chord.length());
  }

  /** An offset at the mast top, turned with it: lean, then twist (both small). */
  private Vector3 turned(Vector3 offset) {
    TopMovement top = response.top();
    Vector3 turn =
        new Vector3(
            -top.tilt_rad() * Math.cos(top.tiltTowards_rad()),
            top.tilt_rad() * Math.sin(top.tiltTowards_rad()),
            top.twist_rad());
    Vector3 first = turn.cross(offset);
    return offset.plus(first).plus(turn.cross(first).times(0.5));
  }
}
