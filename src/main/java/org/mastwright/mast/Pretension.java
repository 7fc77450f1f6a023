package org.mastwright.mast;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.mastwright.design.GuySet;
import org.mastwright.frame.Catenary;
import org.mastwright.frame.Chain;
import org.mastwright.frame.ChainLoad;
import org.mastwright.frame.Equilibrium;
import org.mastwright.frame.EquilibriumException;
import org.mastwright.frame.EquilibriumSolver;
import org.mastwright.loads.PretensionState;
import org.mastwright.working.AnalysisException;

/**
 * Unstretched lengths of the guys from the tensions that were set.
 *
 * <p>With {@code upright} the guy that was set has its tension in the still-air equilibrium; the
 * others of its level take, by least squares of relative change, what keeps the level plumb.
 * Without, every guy has its tension on the undeformed mast.
 */
final class Pretension {
  private static final double SLIP_FRACTION = 0.05;
  private static final double UNEVEN_FRACTION = 0.10;
  private static final int MOST_ROUNDS = 60;
  private static final double PLUMB_M = 1e-7;
  private static final double RELAXATION = 0.8;

  private final Chain bare;
  private final GuyPlaces guys;
  private final PretensionState state;

  private Pretension(Chain bare, GuyPlaces guys, PretensionState state) {
    this.bare = bare;
    this.guys = guys;
    this.state = state;
  }

  /**
   * Unstretched length of each guy.
   *
   * @param bare the straight chain with its bodies, without guys
   */
  static double[] unstretched_m(Chain bare, GuyPlaces guys, PretensionState state) {
    Pretension p = new Pretension(bare, guys, state);
    double[] tensions = p.stated_N();
    boolean upright = guys.all().stream().anyMatch(g -> g.set().upright());
    double[] lengths = upright ? p.plumb(tensions) : p.lengths(tensions, p.atRest());
    if (state == PretensionState.UNEVEN) {
      p.disturb(lengths);
    }
    return lengths;
  }

  /** Tension of each guy as stated, in this state. */
  private double[] stated_N() {
    double[] tensions = new double[guys.size()];
    for (int i = 0; i < tensions.length; i++) {
      GuyPlaces.Place g = guys.all().get(i);
      tensions[i] = stated_N(g) * stateFactor(g.set());
    }
    return tensions;
  }

  private double stated_N(GuyPlaces.Place g) {
    GuySet.Tension t = g.set().tension();
    double breaking = g.set().rope().breaking_N();
    if (t instanceof GuySet.Tension.Force f) {
      int one = f.values_N().size() == 1 ? 0 : g.index();
      return f.values_N().get(one);
    }
    if (t instanceof GuySet.Tension.OfBreaking b) {
      return b.fraction() * breaking;
    }
    if (t instanceof GuySet.Tension.Sag s) {
      return fromSag_N(g, s.sag_m());
    }
    if (t instanceof GuySet.Tension.Pulse p) {
      double speed = 2 * chord_m(g) * p.returns() / p.time_s();
      return g.set().rope().mass_kgpm() * speed * speed;
    }
    return 0.02 * breaking;
  }

  /** Snug is a range by itself; anything else is off by tolerance and slip. */
  private double stateFactor(GuySet set) {
    boolean snug = set.tension() instanceof GuySet.Tension.Snug;
    return switch (state) {
      case NOMINAL, UNEVEN -> 1;
      case LOW -> snug ? 0.25 : (1 - set.toleranceFraction()) * (1 - SLIP_FRACTION);
      case HIGH -> snug ? 2.5 : 1 + set.toleranceFraction();
    };
  }

  /** Tension at the anchor for a sag at mid-length: from the parabola, then made exact. */
  private double fromSag_N(GuyPlaces.Place g, double sag_m) {
    Chain.Point span = span(g, atRest()[guys.all().indexOf(g)]);
    double level_m = Math.hypot(span.x_m(), span.y_m());
    double weight = g.set().rope().mass_kgpm() * bare.gravity_mps2();
    double tension = weight * level_m * chord_m(g) / (8 * sag_m);
    List<ChainLoad.Components> own = GuyPlaces.ownWeight(g.set(), bare.gravity_mps2());
    for (int i = 0; i < 20; i++) {
      double length = Catenary.unstretchedForTension_m(span, g.axial_N(), tension, true, own);
      double found = Catenary.between(span, g.axial_N(), length, own).sag_m();
      tension *= found / sag_m;
      if (Math.abs(found / sag_m - 1) < 1e-9) {
        break;
      }
    }
    return tension;
  }

  private double chord_m(GuyPlaces.Place g) {
    Chain.Point s = span(g, atRest()[guys.all().indexOf(g)]);
    return Math.sqrt(s.x_m() * s.x_m() + s.y_m() * s.y_m() + s.z_m() * s.z_m());
  }

  /** Attachments on the undeformed mast. */
  private Chain.Point[] atRest() {
    return guys.all().stream()
        .map(
            g -> {
              Chain.Point n = bare.nodes().get(g.node());
              return new Chain.Point(
                  n.x_m() + g.offset_m().x_m(), n.y_m() + g.offset_m().y_m(), n.z_m());
            })
        .toArray(Chain.Point[]::new);
  }

  private static Chain.Point span(GuyPlaces.Place g, Chain.Point end) {
    return new Chain.Point(
        end.x_m() - g.anchor_m().x_m(),
        end.y_m() - g.anchor_m().y_m(),
        end.z_m() - g.anchor_m().z_m());
  }

  private double[] lengths(double[] tensions, Chain.Point[] ends) {
    double[] lengths = new double[tensions.length];
    for (int i = 0; i < lengths.length; i++) {
      GuyPlaces.Place g = guys.all().get(i);
      lengths[i] =
          Catenary.unstretchedForTension_m(
              span(g, ends[i]),
              g.axial_N(),
              tensions[i],
              g.set().tensionAtAnchor() || !(g.set().tension() instanceof GuySet.Tension.Force),
              GuyPlaces.ownWeight(g.set(), bare.gravity_mps2()));
    }
    return lengths;
  }

  Chain with(double[] lengths) {
    return with(bare, guys, lengths);
  }

  static Chain with(Chain bare, GuyPlaces guys, double[] lengths) {
    List<Chain.Cable> cables = new ArrayList<>();
    for (int i = 0; i < lengths.length; i++) {
      cables.add(guys.all().get(i).cable(lengths[i]));
    }
    return bare.withCables(cables);
  }

  /** Tensions and lengths that leave every level plumb in still air. */
  private double[] plumb(double[] stated) {
    double[] tensions = stated.clone();
    Chain.Point[] ends = atRest();
    double[][] wanted = new double[guys.size()][2];
    Optional<Equilibrium> last = Optional.empty();
    for (int round = 0; round < MOST_ROUNDS; round++) {
      balanceLevels(tensions, stated, ends, wanted);
      double[] lengths = lengths(tensions, ends);
      Equilibrium now;
      try {
        now =
            EquilibriumSolver.solve(
                with(lengths), ChainLoad.weightOnly(), 1, last, EquilibriumSolver.Options.USUAL);
      } catch (EquilibriumException lost) {
        throw new AnalysisException(
            "No equilibrium in still air while the guys are set: "
                + lost.getMessage()
                + ". Likely: too little tension, or the mast cannot carry its own weight.",
            lost);
      }
      double off = correct(now, ends, wanted, lengths);
      last = Optional.of(now);
      if (off < PLUMB_M) {
        return lengths;
      }
    }
    throw new AnalysisException(
        "The guys could not be set so that the mast stands plumb in still air after "
            + MOST_ROUNDS
            + " rounds. Likely: a level whose guys do not pull from all sides.");
  }

  /**
   * Takes the lean found into the level forces wanted and the settling into the attachments;
   * returns the greatest lean.
   */
  private double correct(Equilibrium now, Chain.Point[] ends, double[][] wanted, double[] lengths) {
    double off = 0;
    for (int i = 0; i < ends.length; i++) {
      GuyPlaces.Place g = guys.all().get(i);
      Chain.Point moved = now.movement_m(g.node());
      off = Math.max(off, Math.hypot(moved.x_m(), moved.y_m()));
      Chain.Point turned = now.turned_m(g.node(), g.offset_m());
      Chain.Point place = now.place_m(g.node());
      off = Math.max(off, Math.abs(ends[i].z_m() - place.z_m() - turned.z_m()));
      ends[i] = new Chain.Point(turned.x_m(), turned.y_m(), place.z_m() + turned.z_m());
      double stiffness = RELAXATION * levelStiffness(g.node(), ends, lengths);
      wanted[i][0] -= stiffness * moved.x_m();
      wanted[i][1] -= stiffness * moved.y_m();
    }
    return off;
  }

  /** About what the guys of a level resist a level movement with. */
  private double levelStiffness(int node, Chain.Point[] ends, double[] lengths) {
    double sum = 0;
    for (int i = 0; i < ends.length; i++) {
      GuyPlaces.Place g = guys.all().get(i);
      if (g.node() == node) {
        sum +=
            Catenary.between(
                    span(g, ends[i]),
                    g.axial_N(),
                    lengths[i],
                    GuyPlaces.ownWeight(g.set(), bare.gravity_mps2()))
                .levelStiffness_Npm();
      }
    }
    return sum;
  }

  /** Tensions of each level whose level resultant is what is wanted, changed least. */
  private void balanceLevels(
      double[] tensions, double[] stated, Chain.Point[] ends, double[][] wanted) {
    int from = 0;
    while (from < tensions.length) {
      GuySet set = guys.all().get(from).set();
      int to = from + set.guys().size();
      if (set.upright()) {
        balance(tensions, stated, ends, wanted[from], from, to, from + set.settingGuy());
      }
      from = to;
    }
  }

  private void balance(
      double[] tensions,
      double[] stated,
      Chain.Point[] ends,
      double[] wanted,
      int from,
      int to,
      int kept) {
    double rx = wanted[0];
    double ry = wanted[1];
    double[][] pull = new double[to - from][2];
    for (int i = from; i < to; i++) {
      double[] unit = levelPull(i, tensions[i], ends[i]);
      pull[i - from] = unit;
      rx -= stated[i] * unit[0];
      ry -= stated[i] * unit[1];
    }
    double a = 0;
    double b = 0;
    double c = 0;
    for (int i = from; i < to; i++) {
      if (i != kept) {
        double w = stated[i] * stated[i];
        a += w * pull[i - from][0] * pull[i - from][0];
        b += w * pull[i - from][0] * pull[i - from][1];
        c += w * pull[i - from][1] * pull[i - from][1];
      }
    }
    double det = a * c - b * b;
    double p = (c * rx - b * ry) / det;
    double q = (a * ry - b * rx) / det;
    for (int i = from; i < to; i++) {
      if (i != kept) {
        double w = stated[i] * stated[i];
        tensions[i] =
            Math.max(
                0.02 * stated[i], stated[i] + w * (pull[i - from][0] * p + pull[i - from][1] * q));
      }
    }
  }

  /** Level pull on the mast of a guy, for one newton of its stated tension. */
  private double[] levelPull(int i, double tension, Chain.Point end) {
    GuyPlaces.Place g = guys.all().get(i);
    Chain.Point s = span(g, end);
    List<ChainLoad.Components> own = GuyPlaces.ownWeight(g.set(), bare.gravity_mps2());
    boolean atAnchor =
        g.set().tensionAtAnchor() || !(g.set().tension() instanceof GuySet.Tension.Force);
    double length = Catenary.unstretchedForTension_m(s, g.axial_N(), tension, atAnchor, own);
    Catenary now = Catenary.between(s, g.axial_N(), length, own);
    double level = now.levelPull_N() / tension;
    double out = Math.hypot(s.x_m(), s.y_m());
    return new double[] {-level * s.x_m() / out, -level * s.y_m() / out};
  }

  /** One guy of the top level a tenth tighter than the others were set with. */
  private void disturb(double[] lengths) {
    int last = lengths.length - guys.all().get(lengths.length - 1).set().guys().size();
    GuyPlaces.Place g = guys.all().get(last);
    double more = UNEVEN_FRACTION * stated_N(g) / g.axial_N();
    lengths[last] *= 1 - more;
  }
}
