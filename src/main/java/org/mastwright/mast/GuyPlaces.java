package org.mastwright.mast;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.frame.Chain;
import org.mastwright.frame.ChainLoad;

/** The guys of a design in one row, lowest set first, with their places in the chain. */
final class GuyPlaces {
  private final List<Place> places = new ArrayList<>();

  /**
   * One guy.
   *
   * @param index in its set, from 0
   */
  record Place(GuySet set, int index, int node, Chain.Point offset_m, Chain.Point anchor_m) {
    double axial_N() {
      return set.rope().modulus_Pa() * set.rope().area_m2();
    }

    double azimuth_rad() {
      return set.guys().get(index).azimuth_rad();
    }

    Chain.Cable cable(double unstretched_m) {
      return new Chain.Cable(
          node,
          offset_m,
          anchor_m,
          axial_N(),
          set.rope().mass_kgpm(),
          unstretched_m,
          set.thermalExpansion_perK());
    }
  }

  GuyPlaces(Design design, Mesh mesh) {
    for (GuySet set : design.tower().guys()) {
      for (int i = 0; i < set.guys().size(); i++) {
        GuySet.Guy guy = set.guys().get(i);
        Ground.Anchor anchor = design.ground().anchors().get(guy.anchor());
        places.add(
            new Place(
                set,
                i,
                mesh.nodeAt(set.along_m()),
                new Chain.Point(
                    set.arm_m() * Math.sin(guy.azimuth_rad()),
                    set.arm_m() * Math.cos(guy.azimuth_rad()),
                    0),
                new Chain.Point(anchor.east_m(), anchor.north_m(), anchor.up_m())));
      }
    }
  }

  List<Place> all() {
    return places;
  }

  int size() {
    return places.size();
  }

  /** Position in the row of a guy of a set, or −1. */
  int indexOf(int set, int index) {
    for (int i = 0; i < places.size(); i++) {
      if (places.get(i).set().number() == set && places.get(i).index() == index) {
        return i;
      }
    }
    return -1;
  }

  /** The load of a cable's own weight. */
  static List<ChainLoad.Components> ownWeight(GuySet set, double gravity_mps2) {
    return List.of(new ChainLoad.Components(0, 0, -set.rope().mass_kgpm() * gravity_mps2));
  }
}
