package org.mastwright.loads;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.design.Basis;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.design.Rotor;
import org.mastwright.design.Tower;
import org.mastwright.design.Tube;
import org.mastwright.design.Turbine;
import org.mastwright.forces.Vector3;
import org.mastwright.rotor.IecRotorLoads;
import org.mastwright.rotor.RotorStates;
import org.mastwright.wind.DesignWind;
import org.mastwright.wind.IecWind;

/** The unfactored actions of the simplified model of IEC 61400-2, for any wind and direction. */
final class IecLoads {
  /** A flat part. */
  static final double FLAT_CF = 1.5;

  /** A vane or blade edge on. */
  static final double EDGE_CF = 0.3;

  /** Round tube below the critical Reynolds number: taken at every one, so never too small. */
  static final double ROUND_CF = 1.2;

  /** A tube of less than 0.1 m (the standard's table, recalled). */
  static final double THIN_CF = 1.3;

  /** A many-sided tube. */
  static final double POLYGON_CF = 1.4;

  private static final double LONGEST_PIECE_M = 1.5;
  private static final int GUY_PARTS = 3;
  private static final double GUST_EXPONENT = 0.11;

  final Design design;
  final Turbine turbine;
  final Rotor rotor;
  final DesignWind wind;
  final RotorStates states;

  IecLoads(Design design, DesignWind wind, RotorStates states) {
    this.design = design;
    this.turbine = design.turbine().orElseThrow();
    this.rotor = turbine.rotor();
    this.wind = wind;
    this.states = states;
  }

  static String basisTitle() {
    return Basis.LoadBasis.IEC_61400_2.title();
  }

  /** How the head stands to the wind. */
  enum Facing {
    INTO_WIND(0),
    ACROSS(Math.PI / 2),
    AWAY(Math.PI);

    private final double turn_rad;

    Facing(double turn_rad) {
      this.turn_rad = turn_rad;
    }

    /** Bearing the rotor's front points to. */
    double front_rad(double windFrom_rad) {
      return windFrom_rad + turn_rad;
    }
  }

  /** Level unit vector the rotor plane lies towards, from the axis. */
  private Vector3 towardsRotor(double windFrom_rad, Facing facing) {
    double front = facing.front_rad(windFrom_rad);
    double sign = rotor.position() == Rotor.Position.UPWIND ? 1 : -1;
    return Vector3.towards(front, sign);
  }

  Vector3 headCentre_m(double windFrom_rad, Facing facing) {
    Vector3 ahead = towardsRotor(windFrom_rad, facing).times(turbine.head().centreAhead_m());
    return ahead.plus(new Vector3(0, 0, turbine.head().centreAboveTop_m()));
  }

  Vector3 hub_m(double windFrom_rad, Facing facing) {
    Vector3 out = towardsRotor(windFrom_rad, facing).times(rotor.overhang_m());
    return out.plus(new Vector3(0, 0, turbine.head().hubAboveTop_m()));
  }

  static Vector3 downwind(double windFrom_rad, double size) {
    return Vector3.towards(windFrom_rad + Math.PI, size);
  }

  /** Thrust on the rotor at the hub with a moment. */
  LoadCase.PointLoad rotorLoad(
      double windFrom_rad, Facing facing, double thrust_N, Vector3 moment_Nm, double factor) {
    return new LoadCase.PointLoad(
        "rotor",
        design.tower().length_m(),
        hub_m(windFrom_rad, facing),
        downwind(windFrom_rad, thrust_N * factor),
        moment_Nm.times(factor));
  }

  /** Drag of the head's side and the tail. */
  List<LoadCase.PointLoad> headDrag(
      double windFrom_rad, Facing facing, double speed_mps, double factor) {
    double q = IecWind.pressure_Pa(wind.density_kgpm3(), speed_mps);
    double top_m = design.tower().length_m();
    List<LoadCase.PointLoad> loads = new ArrayList<>();
    loads.add(
        new LoadCase.PointLoad(
            "head",
            top_m,
            new Vector3(0, 0, turbine.head().hubAboveTop_m()),
            downwind(windFrom_rad, factor * q * FLAT_CF * turbine.head().sideArea_m2()),
            Vector3.ZERO));
    turbine
        .tail()
        .ifPresent(
            t -> {
              double cf = facing == Facing.ACROSS ? FLAT_CF : EDGE_CF;
              Vector3 back =
                  Vector3.towards(facing.front_rad(windFrom_rad) + Math.PI, t.arm_m())
                      .plus(new Vector3(0, 0, turbine.head().hubAboveTop_m()));
              loads.add(
                  new LoadCase.PointLoad(
                      "tail",
                      top_m,
                      back,
                      downwind(windFrom_rad, factor * q * cf * t.area_m2()),
                      Vector3.ZERO));
            });
    return loads;
  }

  /** Speed at a height when {@code hubSpeed_mps} blows at the hub. */
  double speedAt_mps(double hubSpeed_mps, double height_m) {
    return hubSpeed_mps * Math.pow(Math.max(height_m, 1) / wind.hub_m(), GUST_EXPONENT);
  }

  /** Force coefficient of a tube's section. */
  static double tubeCf(Tube tube, double outside_m) {
    if (!tube.bottom().isRound()) {
      return POLYGON_CF;
    }
    return outside_m < 0.1 ? THIN_CF : ROUND_CF;
  }

  /** Drag of tubes and attachments by height. */
  List<LoadCase.MastLoad> mastDrag(double windFrom_rad, double hubSpeed_mps, double factor) {
    List<LoadCase.MastLoad> loads = new ArrayList<>();
    Tower tower = design.tower();
    for (Tube tube : tower.tubes()) {
      int pieces = (int) Math.ceil(tube.length_m() / LONGEST_PIECE_M);
      for (int i = 0; i < pieces; i++) {
        double from = tube.bottom_m() + tube.length_m() * i / pieces;
        double to = tube.bottom_m() + tube.length_m() * (i + 1) / pieces;
        loads.add(
            new LoadCase.MastLoad(
                "mast",
                from,
                to,
                downwind(windFrom_rad, factor * tubeDrag_Npm(tube, from, hubSpeed_mps)),
                downwind(windFrom_rad, factor * tubeDrag_Npm(tube, to, hubSpeed_mps))));
      }
    }
    for (Tower.Attachment a : tower.attachments()) {
      if (a.dragArea_m2() > 0 && a.top_m() > a.bottom_m()) {
        double height = tower.footLevel_m() + (a.bottom_m() + a.top_m()) / 2;
        double q = IecWind.pressure_Pa(wind.density_kgpm3(), speedAt_mps(hubSpeed_mps, height));
        Vector3 w =
            downwind(windFrom_rad, factor * q * a.dragArea_m2() / (a.top_m() - a.bottom_m()));
        loads.add(new LoadCase.MastLoad(a.what(), a.bottom_m(), a.top_m(), w, w));
      }
    }
    return loads;
  }

  double tubeDrag_Npm(Tube tube, double along_m, double hubSpeed_mps) {
    double height = design.tower().footLevel_m() + along_m;
    double across = tube.sectionAt(along_m).greatestAcross_m();
    double v = speedAt_mps(hubSpeed_mps, height);
    return IecWind.pressure_Pa(wind.density_kgpm3(), v) * tubeCf(tube, across) * across;
  }

  /** Drag of objects at one place. */
  List<LoadCase.PointLoad> objectDrag(double windFrom_rad, double hubSpeed_mps, double factor) {
    List<LoadCase.PointLoad> loads = new ArrayList<>();
    for (Tower.Attachment a : design.tower().attachments()) {
      if (a.dragArea_m2() > 0 && a.top_m() == a.bottom_m()) {
        double height = design.tower().footLevel_m() + a.bottom_m();
        double q = IecWind.pressure_Pa(wind.density_kgpm3(), speedAt_mps(hubSpeed_mps, height));
        loads.add(
            new LoadCase.PointLoad(
                a.what(),
                a.bottom_m(),
                Vector3.ZERO,
                downwind(windFrom_rad, factor * q * a.dragArea_m2()),
                Vector3.ZERO));
      }
    }
    return loads;
  }

  /** Drag of every guy in three parts. */
  List<LoadCase.GuyLoad> guyDrag(double windFrom_rad, double hubSpeed_mps, double factor) {
    List<LoadCase.GuyLoad> loads = new ArrayList<>();
    Tower tower = design.tower();
    for (GuySet set : tower.guys()) {
      for (int i = 0; i < set.guys().size(); i++) {
        Ground.Anchor anchor = design.ground().anchors().get(set.guys().get(i).anchor());
        Vector3 foot = new Vector3(anchor.east_m(), anchor.north_m(), anchor.up_m());
        Vector3 head = new Vector3(0, 0, tower.footLevel_m() + set.along_m());
        Vector3 chord = head.minus(foot);
        Vector3 along = chord.times(1 / chord.length());
        List<Vector3> parts = new ArrayList<>();
        for (int p = 0; p < GUY_PARTS; p++) {
          double height = foot.up() + chord.up() * (p + 0.5) / GUY_PARTS;
          Vector3 v = downwind(windFrom_rad, speedAt_mps(hubSpeed_mps, height));
          parts.add(
              GuyDrag.load_Npm(wind.density_kgpm3(), v, set.rope().diameter_m(), along)
                  .times(factor));
        }
        loads.add(new LoadCase.GuyLoad(new LoadCase.GuyPlace(set.number(), i), parts));
      }
    }
    return loads;
  }

  /** Thrust of the rotor that cannot turn away: edge on across the wind, broadside from behind. */
  double exposed_N(Facing facing, double speed_mps) {
    double cd = facing == Facing.ACROSS ? EDGE_CF : IecRotorLoads.PARKED_CD;
    return IecRotorLoads.parked_N(
        rotor.blades(), cd, wind.density_kgpm3(), speed_mps, rotor.areaPerBlade_m2());
  }
}
