package org.mastwright.loads;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.mastwright.design.Site;
import org.mastwright.forces.CaseMark;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Vector3;
import org.mastwright.units.Numbers;
import org.mastwright.working.Clause;
import org.mastwright.working.Status;
import org.mastwright.working.Step;

/** A combination of the simplified model: weight, pretension and one wind action of one state. */
final class IecCombination implements Combination {
  /** What the machine does in it. */
  enum Kind {
    /** 50-year gust, stopped or spinning, facing the wind. */
    STORM,
    /** Greatest running thrust at 2.5 times the mean wind, off centre by a sixth of the radius. */
    THRUST,
    /** Yaw failed in the reference wind. */
    YAW_FAILED,
    /** One-year gust stopped, and running at the greatest wind it runs in. */
    SERVICE
  }

  private static final double HEAVY_FACTOR = 1.35;
  private static final double LIGHT_FACTOR = 0.9;
  private static final double WIND_FACTOR = 3.0;
  private static final Clause LOAD_FACTOR =
      new Clause("IEC 61400-2", "2013", "7.8, Table 7", Status.READ);
  private static final Clause WEIGHT_FACTOR =
      new Clause("common practice after IEC 61400-1", "-", "permanent actions", Status.PRACTICE);

  private final String code;
  private final Kind kind;
  private final LimitState limitState;
  private final String title;
  private final String purpose;
  private final Clause clause;
  private final IecLoads loads;
  private final List<Step> derivation;

  IecCombination(
      String code,
      Kind kind,
      LimitState limitState,
      String title,
      String purpose,
      Clause clause,
      IecLoads loads,
      List<Step> derivation) {
    this.code = code;
    this.kind = kind;
    this.limitState = limitState;
    this.title = title;
    this.purpose = purpose;
    this.clause = clause;
    this.loads = loads;
    this.derivation = List.copyOf(derivation);
  }

  private boolean factored() {
    return limitState == LimitState.STRENGTH;
  }

  @Override
  public String code() {
    return code;
  }

  @Override
  public String title() {
    return title;
  }

  @Override
  public String purpose() {
    return purpose;
  }

  @Override
  public String composition() {
    return factored() ? "1.35 G (0.9 G) + P low, high + 3.0 W" : "1.0 G + P + 1.0 W";
  }

  @Override
  public LimitState limitState() {
    return limitState;
  }

  @Override
  public Clause clause() {
    return clause;
  }

  @Override
  public List<Factor> factors() {
    if (!factored()) {
      return List.of(new Factor("all actions", 1, WEIGHT_FACTOR));
    }
    return List.of(
        new Factor("wind, simplified model", WIND_FACTOR, LOAD_FACTOR),
        new Factor("weight, unfavourable", HEAVY_FACTOR, WEIGHT_FACTOR),
        new Factor("weight, favourable", LIGHT_FACTOR, WEIGHT_FACTOR),
        new Factor("pretension", 1, WEIGHT_FACTOR));
  }

  @Override
  public List<Step> derivation() {
    return derivation;
  }

  @Override
  public boolean directional() {
    return true;
  }

  @Override
  public List<Variant> variants() {
    boolean guyed = !loads.design.tower().guys().isEmpty();
    return switch (kind) {
      case STORM -> storm(guyed);
      case THRUST -> thrust(guyed);
      case YAW_FAILED ->
          guyed
              ? List.of(
                  v("lo-across", "yaw failed across the wind, loose guys", PretensionState.LOW),
                  v("lo-away", "wind from behind, loose guys", PretensionState.LOW),
                  v("hi-across", "yaw failed across the wind, taut guys", PretensionState.HIGH),
                  v("hi-away", "wind from behind, taut guys", PretensionState.HIGH))
              : List.of(
                  v("across", "yaw failed across the wind", PretensionState.NOMINAL),
                  v("away", "wind from behind", PretensionState.NOMINAL));
      case SERVICE ->
          List.of(
              v("stop", "one-year gust, stopped", PretensionState.NOMINAL),
              v("run", "running at its greatest wind", PretensionState.NOMINAL));
    };
  }

  private List<Variant> storm(boolean guyed) {
    if (!guyed) {
      return factored()
          ? List.of(
              v("heavy", "full weight", PretensionState.NOMINAL),
              v("light", "least weight", PretensionState.NOMINAL))
          : List.of(v("all", "", PretensionState.NOMINAL));
    }
    List<Variant> all = new ArrayList<>();
    all.add(v("lo", "loose guys", PretensionState.LOW));
    all.add(v("hi", "taut guys", PretensionState.HIGH));
    if (factored()) {
      all.add(v("lo-light", "loose guys, least weight", PretensionState.LOW));
      all.add(v("hi-light", "taut guys, least weight", PretensionState.HIGH));
      all.add(v("uneven", "one top guy a tenth tighter", PretensionState.UNEVEN));
    }
    return all;
  }

  private List<Variant> thrust(boolean guyed) {
    PretensionState loose = guyed ? PretensionState.LOW : PretensionState.NOMINAL;
    PretensionState taut = guyed ? PretensionState.HIGH : PretensionState.NOMINAL;
    List<Variant> all = new ArrayList<>();
    all.add(v("lo-up", "thrust above the hub, loose guys", loose));
    if (factored()) {
      all.add(v("lo-down", "thrust below the hub, loose guys", loose));
      all.add(v("lo-left", "thrust left of the hub, loose guys", loose));
      all.add(v("lo-right", "thrust right of the hub, loose guys", loose));
    }
    if (guyed) {
      all.add(v("hi-up", "thrust above the hub, taut guys", taut));
    }
    return all;
  }

  private static Variant v(String key, String words, PretensionState state) {
    return new Variant(key, words, state);
  }

  @Override
  public LoadCase at(double windFrom_rad, Variant variant) {
    double land = loads.wind.speedFactor(windFrom_rad);
    IecLoads.Facing facing = facing(variant);
    double factor = factored() ? WIND_FACTOR : 1;
    double speed = speed_mps(variant) * land;
    List<LoadCase.PointLoad> head = new ArrayList<>();
    double thrust = rotorThrust_N(variant, facing, land);
    head.add(
        loads.rotorLoad(
            windFrom_rad, facing, thrust, moment(windFrom_rad, variant, thrust), factor));
    head.addAll(loads.headDrag(windFrom_rad, facing, speed, factor));
    double pushed_N = 0;
    for (LoadCase.PointLoad p : head) {
      pushed_N += p.force_N().level();
    }
    head.addAll(loads.objectDrag(windFrom_rad, speed, factor));
    return new LoadCase(
        mark(windFrom_rad, variant, pushed_N),
        variant.pretension(),
        gravity(variant),
        temperatureChange_K(variant.pretension()),
        loads.headCentre_m(windFrom_rad, facing),
        head,
        loads.mastDrag(windFrom_rad, speed, factor),
        loads.guyDrag(windFrom_rad, speed, factor),
        List.of(),
        List.of(),
        0,
        1,
        List.of());
  }

  private boolean running(Variant variant) {
    return kind == Kind.THRUST || variant.key().equals("run");
  }

  private CaseMark mark(double windFrom_rad, Variant variant, double pushed_N) {
    double deg = Math.toDegrees(windFrom_rad);
    boolean whole = Math.abs(deg - Math.rint(deg)) < 1e-6;
    String bearing = whole ? Numbers.fixed(deg, 0) : Numbers.fixed(deg, 1);
    String words = variant.words().isEmpty() ? "" : ", " + variant.words();
    return new CaseMark(
        String.format(Locale.ROOT, "%s-%s-%s", code, bearing, variant.key()),
        code,
        title + " from " + bearing + "°" + words,
        IecLoads.basisTitle(),
        limitState,
        windFrom_rad,
        pushed_N,
        running(variant));
  }

  private double gravity(Variant variant) {
    if (!factored()) {
      return 1;
    }
    return variant.key().endsWith("light") ? LIGHT_FACTOR : HEAVY_FACTOR;
  }

  private double temperatureChange_K(PretensionState state) {
    Site.Temperature t = loads.design.site().orElseThrow().temperature();
    return switch (state) {
      case LOW -> t.highest_K() - t.setting_K();
      case HIGH -> t.lowest_K() - t.setting_K();
      case NOMINAL, UNEVEN -> 0;
    };
  }

  private IecLoads.Facing facing(Variant variant) {
    if (kind != Kind.YAW_FAILED) {
      return IecLoads.Facing.INTO_WIND;
    }
    return variant.key().endsWith("across") ? IecLoads.Facing.ACROSS : IecLoads.Facing.AWAY;
  }

  private double speed_mps(Variant variant) {
    return switch (kind) {
      case STORM -> loads.wind.gust50_mps();
      case THRUST -> 2.5 * loads.wind.mean_mps();
      case YAW_FAILED -> loads.wind.reference_mps();
      case SERVICE -> running(variant) ? loads.states.running().wind_mps() : loads.wind.gust1_mps();
    };
  }

  /** Storm thrust goes with the pressure at the site; running thrust is where the rotor runs. */
  private double rotorThrust_N(Variant variant, IecLoads.Facing facing, double land) {
    return switch (kind) {
      case STORM -> loads.states.storm().thrust_N() * land * land;
      case THRUST -> Math.max(loads.states.designThrust().thrust_N(), statedThrust_N());
      case YAW_FAILED -> loads.exposed_N(facing, loads.wind.reference_mps() * land);
      case SERVICE ->
          running(variant)
              ? Math.max(loads.states.running().thrust_N(), statedThrust_N())
              : loads.states.storm().thrust_N()
                  * Math.pow(loads.wind.gust1_mps() / loads.wind.gust50_mps() * land, 2);
    };
  }

  private double statedThrust_N() {
    return loads
        .turbine
        .statedThrust()
        .map(t -> t.curve().stream().mapToDouble(p -> p.thrust_N()).max().orElse(0))
        .orElse(0.0);
  }

  /** Thrust off centre and, running, the torque about the shaft. */
  private Vector3 moment(double windFrom_rad, Variant variant, double thrust_N) {
    if (!running(variant)) {
      return Vector3.ZERO;
    }
    double sixth = loads.rotor.radius_m() / 6;
    Vector3 off =
        switch (variant.key().substring(variant.key().indexOf('-') + 1)) {
          case "up" -> new Vector3(0, 0, sixth);
          case "down" -> new Vector3(0, 0, -sixth);
          case "left" -> Vector3.towards(windFrom_rad - Math.PI / 2, sixth);
          case "right" -> Vector3.towards(windFrom_rad + Math.PI / 2, sixth);
          default -> Vector3.ZERO;
        };
    double spin = loads.rotor.clockwise() ? 1 : -1;
    Vector3 torque = IecLoads.downwind(windFrom_rad, spin * loads.states.torque_Nm());
    return off.cross(IecLoads.downwind(windFrom_rad, thrust_N)).plus(torque);
  }
}
