package org.mastwright.loads;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.mastwright.design.Design;
import org.mastwright.design.GuySet;
import org.mastwright.design.Rotor;
import org.mastwright.design.Site;
import org.mastwright.design.Tube;
import org.mastwright.forces.LimitState;
import org.mastwright.rotor.IecRotorLoads;
import org.mastwright.rotor.RotorStates;
import org.mastwright.units.Unit;
import org.mastwright.wind.DesignWind;
import org.mastwright.wind.IecWind;
import org.mastwright.working.Clause;
import org.mastwright.working.Derivation;
import org.mastwright.working.Finding;
import org.mastwright.working.Status;
import org.mastwright.working.Step;

/**
 * The loads of one basis: IEC 61400-2 simplified.
 *
 * @param directions_rad the wind comes from, that are always run
 * @param guyBearings_rad the few of them that show what the guys do to the frequencies
 */
public record LoadModel(
    List<Combination> combinations,
    List<Double> directions_rad,
    List<Double> guyBearings_rad,
    List<Derivation> derivations,
    List<Finding> findings,
    DesignWind wind,
    RotorStates rotor) {
  private static final double GREATEST_SWEPT_M2 = 200;

  public LoadModel {
    combinations = List.copyOf(combinations);
    directions_rad = List.copyOf(directions_rad);
    guyBearings_rad = List.copyOf(guyBearings_rad);
    derivations = List.copyOf(derivations);
    findings = List.copyOf(findings);
  }

  /** The loads of a design with site and turbine; the basis is IEC 61400-2. */
  public static LoadModel of(Design design) {
    double hub_m =
        design.tower().topHeight_m() + design.turbine().orElseThrow().head().hubAboveTop_m();
    DesignWind wind = DesignWind.of(design.site().orElseThrow(), hub_m);
    RotorStates rotor = RotorStates.of(design.turbine().orElseThrow(), wind);
    IecLoads loads = new IecLoads(design, wind, rotor);
    List<Finding> findings = findings(design);
    boolean outside = findings.stream().anyMatch(f -> f.id().equals("iec-outside"));
    return new LoadModel(
        outside ? List.of() : combinations(loads),
        directions(design),
        guyBearings(design),
        derivations(loads),
        findings,
        wind,
        rotor);
  }

  /**
   * The rotor running in its greatest wind, unfactored: towards the first guy of the top level and
   * towards the gap beside it, or from the north for a monopole. Empty outside the model.
   */
  public List<LoadCase> running() {
    List<LoadCase> all = new ArrayList<>();
    for (Combination c : combinations) {
      for (Combination.Variant v : c.variants()) {
        if (c.limitState() == LimitState.SERVICE && v.key().equals("run")) {
          guyBearings_rad.forEach(b -> all.add(c.at(b, v)));
        }
      }
    }
    return all;
  }

  /** Wind along the first guy of the top level, from it and towards it, and between two guys. */
  private static List<Double> guyBearings(Design design) {
    List<GuySet> sets = design.tower().guys();
    if (sets.isEmpty()) {
      return List.of(0.0);
    }
    List<GuySet.Guy> guys = sets.get(sets.size() - 1).guys();
    double along = guys.get(0).azimuth_rad();
    double between = (guys.get(1).azimuth_rad() - along) / 2;
    return List.of(along, along + Math.PI, along + between);
  }

  private static Clause iec(String number) {
    return new Clause("IEC 61400-2", "2013", number, Status.RECALLED);
  }

  private static List<Combination> combinations(IecLoads l) {
    List<Combination> all = new ArrayList<>();
    String storm = "It shows that the tower stands in the gust met once in fifty years.";
    add(all, l, "I1", IecCombination.Kind.STORM, "storm wind", storm, iec("7.4.9, case H"));
    String thrust = "It shows that the tower bears the greatest push of the running rotor.";
    add(all, l, "I2", IecCombination.Kind.THRUST, "greatest thrust", thrust, iec("7.4.5, case D"));
    String yaw = "It shows that the tower stands when the head cannot turn out of a strong wind.";
    add(all, l, "I6", IecCombination.Kind.YAW_FAILED, "yaw failed", yaw, iec("7.4.10, case I"));
    all.add(
        new IecCombination(
            "I11",
            IecCombination.Kind.SERVICE,
            LimitState.SERVICE,
            "every year",
            "It shows how far the tower leans and whether blades and guys keep apart.",
            iec("service, one-year gust and operation"),
            l,
            List.of()));
    return all;
  }

  private static void add(
      List<Combination> all,
      IecLoads l,
      String code,
      IecCombination.Kind kind,
      String title,
      String purpose,
      Clause clause) {
    all.add(
        new IecCombination(code, kind, LimitState.STRENGTH, title, purpose, clause, l, List.of()));
    all.add(
        new IecCombination(
            code + "k",
            kind,
            LimitState.CHARACTERISTIC,
            title + ", unfactored",
            "The same without factors: reactions for the ground and for comparison.",
            clause,
            l,
            List.of()));
  }

  /** Every 15° and every bearing towards a guy, away from it and midway between two. */
  private static List<Double> directions(Design design) {
    TreeSet<Long> keys = new TreeSet<>();
    for (int deg = 0; deg < 360; deg += 15) {
      addDirection(keys, Math.toRadians(deg));
    }
    for (GuySet set : design.tower().guys()) {
      int n = set.guys().size();
      for (int i = 0; i < n; i++) {
        double here = set.guys().get(i).azimuth_rad();
        double next = set.guys().get((i + 1) % n).azimuth_rad();
        addDirection(keys, here);
        addDirection(keys, here + Math.PI);
        double gap = (next - here + 4 * Math.PI) % (2 * Math.PI);
        addDirection(keys, here + gap / 2);
      }
    }
    return keys.stream().map(k -> Math.toRadians(k / 10.0)).toList();
  }

  /** To a tenth of a degree. */
  private static void addDirection(TreeSet<Long> keys, double bearing_rad) {
    long tenth = Math.round(Math.toDegrees(bearing_rad) * 10) % 3600;
    keys.add(tenth < 0 ? tenth + 3600 : tenth);
  }

  private static List<Derivation> derivations(IecLoads l) {
    List<Derivation> all = new ArrayList<>();
    all.add(
        new Derivation(
            "Wind at the hub",
            "From the stated wind to the speeds of IEC 61400-2 at the hub.",
            l.wind.steps()));
    all.add(
        new Derivation(
            "The machine, state by state",
            "Momentum theory while it runs; the simplified model for the greatest thrust and the"
                + " storm. Furled is not unloaded: full thrust is taken up to the wind at which"
                + " furling is complete.",
            l.states.steps()));
    all.add(
        new Derivation(
            "Head and tail in the storm",
            "Side area as a flat plate from every direction; the tail edge on when it follows the"
                + " wind, broadside when the yaw has failed.",
            headSteps(l)));
    all.add(
        new Derivation(
            "The mast in the storm",
            "Wind by height; one place of each tube is shown. Round tubes take the coefficient"
                + " below the critical Reynolds number at every speed, which is never too small.",
            mastSteps(l)));
    if (!l.design.tower().guys().isEmpty()) {
      all.add(
          new Derivation(
              "The guys in the storm",
              "Each guy in three parts by height, square to the guy. Shown: the middle of the top"
                  + " guys with the wind square to them.",
              guySteps(l)));
    }
    return all;
  }

  private static List<Step> headSteps(IecLoads l) {
    List<Step> steps = new ArrayList<>();
    double rho = l.wind.density_kgpm3();
    double v = l.wind.gust50_mps();
    steps.add(IecRotorLoads.PART_DRAG.at(IecLoads.FLAT_CF, rho, v, l.turbine.head().sideArea_m2()));
    l.turbine
        .tail()
        .ifPresent(
            t -> steps.add(IecRotorLoads.PART_DRAG.at(IecLoads.EDGE_CF, rho, v, t.area_m2())));
    return steps;
  }

  private static List<Step> mastSteps(IecLoads l) {
    List<Step> steps = new ArrayList<>();
    for (Tube tube : l.design.tower().tubes()) {
      double z = Math.max(1, l.design.tower().footLevel_m() + tube.top_m());
      Step v = IecWind.GUST_AT.at(l.wind.reference_mps(), z, l.wind.hub_m());
      Step q = IecWind.PRESSURE.at(l.wind.density_kgpm3(), v.si());
      double drag = l.tubeDrag_Npm(tube, tube.top_m(), l.wind.gust50_mps());
      steps.add(v);
      steps.add(q);
      steps.add(
          Step.given(
              "w",
              "q · C_f · width, top of " + tube.label(),
              drag,
              Unit.NPM,
              iec("7.4.9, force coefficients")));
    }
    return steps;
  }

  private static List<Step> guySteps(IecLoads l) {
    List<GuySet> sets = l.design.tower().guys();
    GuySet top = sets.get(sets.size() - 1);
    double z = Math.max(1, l.design.tower().footLevel_m() + top.along_m() / 2);
    Step v = IecWind.GUST_AT.at(l.wind.reference_mps(), z, l.wind.hub_m());
    Step q = IecWind.PRESSURE.at(l.wind.density_kgpm3(), v.si());
    double d = top.rope().diameter_m();
    return List.of(v, q, GuyDrag.PER_LENGTH.at(q.si(), GuyDrag.cd(v.si(), d), d, Math.PI / 2));
  }

  private static List<Finding> findings(Design design) {
    List<Finding> all = new ArrayList<>();
    Rotor rotor = design.turbine().orElseThrow().rotor();
    boolean inside =
        rotor.kind() == Rotor.Kind.PROPELLER
            && rotor.blades() >= 2
            && rotor.sweptArea_m2() <= GREATEST_SWEPT_M2;
    if (!inside) {
      all.add(
          Finding.at(
              "iec-outside",
              Finding.Severity.OPEN_POINT,
              "basis.loads",
              "The simplified model of IEC 61400-2 holds for propeller rotors with two or more"
                  + " cantilevered blades and at most 200 m² swept; this rotor is outside it, and"
                  + " no load case is calculated for it.",
              "Use the loads of en-1991-1-4 or asce-7-16 with measured rotor loads."));
    }
    String terrain = design.site().orElseThrow().wind().terrain();
    if (List.of("0", "I", "D").contains(terrain)) {
      all.add(
          Finding.at(
              "open-water",
              Finding.Severity.OPEN_POINT,
              "site.wind.terrain",
              "Terrain "
                  + terrain
                  + " is smoother than open country: the wind near the ground is stronger there,"
                  + " and nothing is added for it.",
              "Give the speed that was measured or mapped for this terrain."));
    }
    Site.Ice ice = design.site().orElseThrow().ice();
    if (ice instanceof Site.Ice.Thickness || ice instanceof Site.Ice.IsoClass) {
      all.add(
          Finding.at(
              "ice-not-calculated",
              Finding.Severity.OPEN_POINT,
              "site.ice",
              "Ice is stated; IEC 61400-2 has no ice case in its simplified model and none is"
                  + " calculated here.",
              "Have ice with wind checked by the building code of the place."));
    }
    all.add(
        Finding.of(
            "cases-b-c-e-f-g-j",
            Finding.Severity.OPEN_POINT,
            "Of the simplified model the cases D, H and I are calculated. Yawing (B), yaw error"
                + " (C), maximum speed (E), short circuit (F), braking (G) and handling (J) are"
                + " not, nor fatigue (A).",
            "Let a licensed engineer judge whether case B, C, E, F, G or J of IEC 61400-2, or fatigue,"
                + " governs this tower."));
    return all;
  }
}
