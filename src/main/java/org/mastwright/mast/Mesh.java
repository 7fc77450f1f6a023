package org.mastwright.mast;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.mastwright.design.GuySet;
import org.mastwright.design.Joint;
import org.mastwright.design.Section;
import org.mastwright.design.Tower;
import org.mastwright.design.Tube;
import org.mastwright.frame.Chain;

/** Where the nodes are along the mast, and the beam between each two of them. */
final class Mesh {
  /** Pieces of the whole length; twice as many move no answer by a tenth of a percent (tested). */
  private static final int USUAL_PIECES = 48;

  /** Places nearer than this are one node. */
  private static final double SAME_M = 1e-6;

  private final Tower tower;
  private final double[] along_m;

  private Mesh(Tower tower, double[] along_m) {
    this.tower = tower;
    this.along_m = along_m;
  }

  /** A node at every tube end, guy level, joint and object, and pieces of even length between. */
  static Mesh usual(Tower tower) {
    return cut(tower, tower.length_m() / USUAL_PIECES);
  }

  /** The same with a given number of pieces in each tube. */
  static Mesh perTube(Tower tower, int pieces) {
    TreeSet<Double> cuts = breaks(tower);
    List<Double> all = new ArrayList<>();
    double before = Double.NaN;
    for (double here : cuts) {
      if (!Double.isNaN(before)) {
        double tube_m = tubeAt(tower, (before + here) / 2).length_m();
        divide(all, before, here, tube_m / pieces);
      }
      before = here;
    }
    all.add(before);
    return new Mesh(tower, all.stream().mapToDouble(Double::doubleValue).toArray());
  }

  private static Mesh cut(Tower tower, double longest_m) {
    List<Double> all = new ArrayList<>();
    double before = Double.NaN;
    for (double here : breaks(tower)) {
      if (!Double.isNaN(before)) {
        divide(all, before, here, longest_m);
      }
      before = here;
    }
    all.add(before);
    return new Mesh(tower, all.stream().mapToDouble(Double::doubleValue).toArray());
  }

  private static void divide(List<Double> all, double from, double to, double longest_m) {
    int pieces = Math.max(1, (int) Math.ceil((to - from) / longest_m - 1e-9));
    for (int i = 0; i < pieces; i++) {
      all.add(from + (to - from) * i / pieces);
    }
  }

  private static TreeSet<Double> breaks(Tower tower) {
    TreeSet<Double> cuts = new TreeSet<>();
    add(cuts, 0);
    for (Tube tube : tower.tubes()) {
      add(cuts, tube.top_m());
    }
    for (GuySet set : tower.guys()) {
      add(cuts, set.along_m());
    }
    for (Joint joint : tower.joints()) {
      add(cuts, Math.min(joint.along_m(), tower.length_m()));
    }
    for (Tower.Attachment a : tower.attachments()) {
      if (a.bottom_m() == a.top_m()) {
        add(cuts, a.bottom_m());
      }
    }
    return cuts;
  }

  private static void add(TreeSet<Double> cuts, double place_m) {
    Double below = cuts.floor(place_m);
    Double above = cuts.ceiling(place_m);
    boolean known =
        below != null && place_m - below < SAME_M || above != null && above - place_m < SAME_M;
    if (!known) {
      cuts.add(place_m);
    }
  }

  int nodes() {
    return along_m.length;
  }

  double along_m(int node) {
    return along_m[node];
  }

  /** The node nearest to a place. */
  int nodeAt(double place_m) {
    int best = 0;
    for (int i = 1; i < along_m.length; i++) {
      if (Math.abs(along_m[i] - place_m) < Math.abs(along_m[best] - place_m)) {
        best = i;
      }
    }
    return best;
  }

  private static Tube tubeAt(Tower tower, double place_m) {
    for (Tube tube : tower.tubes()) {
      if (place_m < tube.top_m()) {
        return tube;
      }
    }
    return tower.tubes().get(tower.tubes().size() - 1);
  }

  /**
   * The beams.
   *
   * @param stiffnessFactor on modulus and shear modulus (AISC 360 direct analysis: 0.8)
   * @param addedMass_kgpm besides the tube's and the attachments'
   */
  List<Chain.Beam> beams(double stiffnessFactor, boolean shears, double addedMass_kgpm) {
    List<Chain.Beam> beams = new ArrayList<>();
    for (int i = 0; i < along_m.length - 1; i++) {
      double middle_m = (along_m[i] + along_m[i + 1]) / 2;
      Tube tube = tubeAt(tower, middle_m);
      beams.add(
          beam(tube, tube.sectionAt(middle_m), stiffnessFactor, shears)
              .apply(massPerLength(tube, middle_m) + attached(i) + addedMass_kgpm));
    }
    return List.copyOf(beams);
  }

  private interface WithMass {
    Chain.Beam apply(double mass_kgpm);
  }

  private static WithMass beam(Tube tube, Section s, double factor, boolean shears) {
    double e = tube.steel().modulus_Pa() * factor;
    double g = tube.steel().shearModulus_Pa() * factor;
    double rotary = shears ? tube.steel().density_kgpm3() * s.secondMoment_m4() : 0;
    double shear = shears ? shearCoefficient(s, tube) * g * s.area_m2() : Double.POSITIVE_INFINITY;
    return mass ->
        new Chain.Beam(
            e * s.area_m2(),
            e * s.secondMoment_m4(),
            g * s.torsionConstant_m4(),
            shear,
            mass,
            rotary,
            2 * tube.steel().density_kgpm3() * s.secondMoment_m4());
  }

  /** Cowper's shear coefficient of a round tube (1966, recalled), used for polygons too. */
  private static double shearCoefficient(Section s, Tube tube) {
    double nu = tube.steel().modulus_Pa() / (2 * tube.steel().shearModulus_Pa()) - 1;
    double m = s.inside_m() / s.outside_m();
    double square = (1 + m * m) * (1 + m * m);
    return 6 * (1 + nu) * square / ((7 + 6 * nu) * square + (20 + 12 * nu) * m * m);
  }

  /** A tapered tube's mass goes with its area; the mean is the tube's own. */
  private static double massPerLength(Tube tube, double middle_m) {
    if (!tube.isTapered()) {
      return tube.nominalMass_kgpm();
    }
    Section half = tube.sectionAt((tube.bottom_m() + tube.top_m()) / 2);
    double mean = (tube.bottom().area_m2() + 4 * half.area_m2() + tube.top().area_m2()) / 6;
    return tube.nominalMass_kgpm() * tube.sectionAt(middle_m).area_m2() / mean;
  }

  /** Attachments spread along the mast, as mass per length of beam {@code i}. */
  private double attached(int i) {
    double length = along_m[i + 1] - along_m[i];
    double sum = 0;
    for (Tower.Attachment a : tower.attachments()) {
      double over = Math.min(a.top_m(), along_m[i + 1]) - Math.max(a.bottom_m(), along_m[i]);
      if (a.top_m() > a.bottom_m() && over > 0) {
        sum += a.mass_kg() * over / (a.top_m() - a.bottom_m()) / length;
      }
    }
    return sum;
  }

  /** Objects at one place, as masses on nodes. */
  List<Chain.Body> objects() {
    List<Chain.Body> bodies = new ArrayList<>();
    for (Tower.Attachment a : tower.attachments()) {
      if (a.bottom_m() == a.top_m() && a.mass_kg() > 0) {
        bodies.add(Chain.Body.point(nodeAt(a.bottom_m()), a.mass_kg()));
      }
    }
    return bodies;
  }
}
