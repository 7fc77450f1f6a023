package org.mastwright.assess;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.design.Design;
import org.mastwright.design.Rotor;
import org.mastwright.design.Tower;
import org.mastwright.design.Turbine;
import org.mastwright.forces.Vector3;
import org.mastwright.loads.LoadCase;
import org.mastwright.mast.ModeFinder;
import org.mastwright.resonance.Excitation;
import org.mastwright.resonance.ModeBand;
import org.mastwright.resonance.SeparationChecks;
import org.mastwright.resonance.SpeedPlan;
import org.mastwright.resonance.SpeedWindow;
import org.mastwright.units.Numbers;
import org.mastwright.working.Check;
import org.mastwright.working.Finding;

/** Natural frequencies with their bands, and what they mean for the rotor's speed. */
record Speeds(
    List<ModeResult> modes,
    SpeedResult result,
    List<Check> checks,
    List<Finding> findings,
    boolean complete,
    double first_Hz,
    double rayleigh_Hz) {
  /** At least so many modes, and all below 2.5 times blade passing, up to a limit. */
  private static final int FEWEST_MODES = 12;

  private static final int MOST_MODES = 30;
  private static final double REACH_FACTOR = 2.5;

  /** A clamped foot is never as stiff as "fixed" says: the margin is doubled. */
  private static final double UNKNOWN_FOOT_MARGIN = 0.20;

  /**
   * @param running loads of the running rotor, about whose deflected shapes the tower swings too
   */
  static Speeds of(Design design, ModeFinder finder, List<LoadCase> running) {
    Turbine turbine = design.turbine().orElseThrow();
    Rotor rotor = turbine.rotor();
    List<Excitation> excitations = Excitation.of(rotor, turbine.extraOrders());
    double top_Hz = turbine.rotorSpeed().highest_radps() / (2 * Math.PI);
    double reach_Hz =
        Math.max(
            REACH_FACTOR * rotor.blades() * top_Hz,
            1.3 * top_Hz * turbine.extraOrders().stream().mapToInt(o -> o).max().orElse(0));
    int below = finder.countBelow(reach_Hz);
    int count = Math.max(FEWEST_MODES, Math.min(MOST_MODES, below + 2));
    List<ModeFinder.State> states =
        finder.states(count, running).stream().filter(s -> !s.modes().isEmpty()).toList();
    List<ModeBand> bands = bands(states);
    boolean fixed = design.tower().base() instanceof Tower.BaseSupport.Fixed;
    double margin =
        fixed ? Math.max(turbine.marginRatio(), UNKNOWN_FOOT_MARGIN) : turbine.marginRatio();
    Turbine.RotorSpeed range = turbine.rotorSpeed();
    boolean upright = rotor.kind().isUpright();
    SpeedPlan plan =
        SpeedPlan.of(
            bands, excitations, margin, range.lowest_radps(), range.highest_radps(), upright);
    List<Finding> findings = new ArrayList<>();
    findings.add(
        Finding.of(
            "margin",
            Finding.Severity.ASSUMPTION,
            "Distance kept from each band of natural frequency: "
                + Numbers.fixed(100 * margin, 0)
                + " %"
                + (fixed ? ", since the stiffness of the foot is not known." : "."),
            fixed ? "Give tower.base: {rotational-stiffness: …} for half of it." : ""));
    if (below > MOST_MODES) {
      findings.add(
          Finding.of(
              "modes-many",
              Finding.Severity.OPEN_POINT,
              "The tower has "
                  + below
                  + " natural frequencies below "
                  + Numbers.significant(reach_Hz, 3)
                  + " Hz; the lowest "
                  + MOST_MODES
                  + " were judged.",
              "Have the higher ones looked at, or lower the highest rotor speed."));
    }
    List<Check> checks =
        SeparationChecks.of(bands, excitations, dwelling(range), margin, upright, List.of());
    ModeFinder.TowerMode first = states.get(0).modes().get(0);
    return new Speeds(
        results(states.get(0), finder.heights_m()),
        result(plan, excitations, bands, upright),
        checks,
        findings,
        states.stream().allMatch(ModeFinder.State::complete),
        first.frequency_Hz(),
        finder.rayleigh_Hz(first.bearing_rad()));
  }

  /** The speed range less what is skipped. */
  private static List<Turbine.Band> dwelling(Turbine.RotorSpeed range) {
    List<Turbine.Band> all = new ArrayList<>();
    double from = range.lowest_radps();
    List<Turbine.Band> skips =
        range.skip().stream()
            .sorted(java.util.Comparator.comparingDouble(Turbine.Band::from_radps))
            .toList();
    for (Turbine.Band skip : skips) {
      if (skip.from_radps() > from) {
        all.add(new Turbine.Band(from, skip.from_radps()));
      }
      from = Math.max(from, skip.to_radps());
    }
    if (from < range.highest_radps()) {
      all.add(new Turbine.Band(from, range.highest_radps()));
    }
    return all;
  }

  private static List<ModeBand> bands(List<ModeFinder.State> states) {
    double most = 0;
    for (ModeFinder.TowerMode m : states.get(0).modes()) {
      most = Math.max(most, m.hubFactor());
    }
    List<ModeBand> bands = new ArrayList<>();
    int bending = 0;
    int twisting = 0;
    for (int i = 0; i < states.get(0).modes().size(); i++) {
      ModeFinder.TowerMode m = states.get(0).modes().get(i);
      int rank = m.isTorsion() ? twisting++ : bending++;
      double low = m.frequency_Hz();
      double high = low;
      for (ModeFinder.State s : states) {
        double f = ofItsKind(s, m.isTorsion(), rank).frequency_Hz();
        low = Math.min(low, f);
        high = Math.max(high, f);
      }
      double share = m.isTorsion() ? m.twistFactor() / most : m.hubFactor() / most;
      bands.add(new ModeBand(i + 1, words(m), low, high, share, m.isTorsion()));
    }
    return bands;
  }

  /**
   * The mode of a state by its rank among those that bend or those that twist: between states a
   * twisting and a bending mode may change places, and neither may hide in the other's band. The
   * last of its kind stands in where a state has fewer among those looked for.
   */
  private static ModeFinder.TowerMode ofItsKind(ModeFinder.State s, boolean torsion, int rank) {
    List<ModeFinder.TowerMode> kind =
        s.modes().stream().filter(m -> m.isTorsion() == torsion).toList();
    return kind.isEmpty() ? s.modes().get(0) : kind.get(Math.min(rank, kind.size() - 1));
  }

  private static String words(ModeFinder.TowerMode m) {
    return m.isTorsion()
        ? "twisting"
        : "bending, " + Numbers.fixed(Math.toDegrees(m.bearing_rad()), 0) + "°";
  }

  static List<ModeResult> results(ModeFinder.State state, List<Double> heights_m) {
    double most =
        state.modes().stream().mapToDouble(ModeFinder.TowerMode::hubFactor).max().orElse(1);
    List<ModeResult> all = new ArrayList<>();
    for (int i = 0; i < state.modes().size(); i++) {
      ModeFinder.TowerMode m = state.modes().get(i);
      all.add(
          new ModeResult(
              state.name(),
              i + 1,
              m.frequency_Hz(),
              m.isTorsion() ? "torsion" : direction(m.bearing_rad()),
              words(m),
              most > 0 ? m.hubFactor() / most : 0,
              shape(m, heights_m)));
    }
    return all;
  }

  private static String direction(double bearing_rad) {
    double deg = Math.toDegrees(bearing_rad);
    if (deg < 5 || deg > 175) {
      return "north";
    }
    return Math.abs(deg - 90) < 5 ? "east" : Numbers.fixed(deg, 0) + "°";
  }

  private static List<ModeResult.ShapePoint> shape(ModeFinder.TowerMode m, List<Double> heights_m) {
    double greatest = 1e-30;
    for (Vector3 v : m.shape()) {
      greatest = Math.max(greatest, m.isTorsion() ? Math.abs(v.up()) : v.level());
    }
    List<ModeResult.ShapePoint> points = new ArrayList<>();
    for (int i = 0; i < heights_m.size(); i++) {
      Vector3 v = m.shape().get(i);
      points.add(
          new ModeResult.ShapePoint(
              heights_m.get(i),
              v.east() / greatest,
              v.north() / greatest,
              m.isTorsion() ? v.up() / greatest : 0));
    }
    return points;
  }

  private static SpeedResult result(
      SpeedPlan plan, List<Excitation> excitations, List<ModeBand> bands, boolean upright) {
    List<SpeedResult.Window> windows = new ArrayList<>();
    for (Turbine.Band merged : plan.merged()) {
      double low = Double.POSITIVE_INFINITY;
      double high = 0;
      List<String> why = new ArrayList<>();
      for (SpeedWindow w : plan.avoid()) {
        if (w.from_radps() <= merged.to_radps() && w.to_radps() >= merged.from_radps()) {
          low = Math.min(low, w.mode().least_Hz());
          high = Math.max(high, w.mode().greatest_Hz());
          why.add("mode " + w.mode().number() + " " + w.excitation().name());
        }
      }
      windows.add(
          new SpeedResult.Window(
              merged.from_radps(), merged.to_radps(), low, high, String.join("; ", why)));
    }
    List<String> remarks = new ArrayList<>();
    for (SpeedWindow w : plan.watch()) {
      remarks.add(
          "watch "
              + Numbers.fixed(w.from_radps() * 30 / Math.PI, 0)
              + " to "
              + Numbers.fixed(w.to_radps() * 30 / Math.PI, 0)
              + " rpm: mode "
              + w.mode().number()
              + " "
              + w.excitation().name());
    }
    return new SpeedResult(
        excitations.stream().map(Excitation::order).toList(),
        plan.lowest_radps(),
        plan.highest_radps(),
        windows,
        plan.clear().stream()
            .map(b -> new SpeedResult.Range(b.from_radps(), b.to_radps()))
            .toList(),
        bands.stream()
            .map(
                b ->
                    new SpeedResult.FrequencyBand(
                        b.number(),
                        b.description(),
                        b.least_Hz(),
                        b.greatest_Hz(),
                        b.hubParticipationRatio() >= 0.05 && (!b.torsion() || upright)))
            .toList(),
        remarks);
  }
}
