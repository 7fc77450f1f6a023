package org.mastwright.rotor;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.mastwright.design.Rotor;
import org.mastwright.design.Turbine;
import org.mastwright.units.Unit;
import org.mastwright.wind.DesignWind;
import org.mastwright.working.Clause;
import org.mastwright.working.Status;
import org.mastwright.working.Step;

/**
 * The states a horizontal-axis machine can be in, with the thrust of each, unfactored.
 *
 * @param running greatest thrust while it runs: full thrust coefficient up to the wind at which
 *     furling is complete or it cuts out
 * @param storm greatest thrust in the 50-year gust, stopped or spinning
 */
public record RotorStates(
    State running,
    State storm,
    State designThrust,
    double torque_Nm,
    List<State> states,
    List<State> operation,
    List<Step> steps) {
  private static final double GREATEST_TIP_MPS = 250;
  private static final double RUNAWAY_OVER_DESIGN = 2;
  private static final Clause CAP =
      new Clause("common practice", "-", "no tip turns faster than 250 m/s", Status.PRACTICE);

  public RotorStates {
    states = List.copyOf(states);
    operation = List.copyOf(operation);
    steps = List.copyOf(steps);
  }

  /** One state. */
  public record State(
      String name,
      double wind_mps,
      double omega_radps,
      double power_W,
      double thrust_N,
      double ct,
      String how) {}

  /** Works out the states; the steps are in reading order. */
  public static RotorStates of(Turbine turbine, DesignWind wind) {
    return new Builder(turbine, wind).build();
  }

  /** Collects states and steps. */
  private static final class Builder {
    private final Turbine turbine;
    private final Rotor rotor;
    private final DesignWind wind;
    private final double area_m2;
    private final double efficiency;
    private final List<Step> steps = new ArrayList<>();
    private final List<State> states = new ArrayList<>();

    Builder(Turbine turbine, DesignWind wind) {
      this.turbine = turbine;
      this.rotor = turbine.rotor();
      this.wind = wind;
      this.area_m2 = rotor.sweptArea_m2();
      Turbine.Rated rated = turbine.rated();
      if (rated.electrical()) {
        Step step = IecRotorLoads.EFFICIENCY.at(rated.power_W());
        steps.add(step);
        this.efficiency = step.si();
      } else {
        this.efficiency = 1;
      }
    }

    RotorStates build() {
      double ct = ratedCt();
      Turbine.Rated r = turbine.rated();
      states.add(running("running at rated", r.wind_mps(), r.omega_radps(), r.power_W(), ct));
      double most = greatestRunningWind();
      State running =
          running(
              "running, greatest wind",
              most,
              turbine.rotorSpeed().highest_radps(),
              r.power_W(),
              ct);
      states.add(running);
      Step d =
          IecRotorLoads.CASE_D.at(
              IecRotorLoads.MAXIMUM_THRUST_CT,
              wind.density_kgpm3(),
              wind.mean_mps(),
              rotor.radius_m());
      steps.add(d);
      State design =
          new State(
              "IEC case D",
              2.5 * wind.mean_mps(),
              r.omega_radps(),
              r.power_W(),
              d.si(),
              IecRotorLoads.MAXIMUM_THRUST_CT,
              "simplified model");
      states.add(design);
      State storm = storm();
      Step torque =
          IecRotorLoads.TORQUE.at(
              turbine.design().power_W(), efficiency, turbine.design().omega_radps());
      steps.add(torque);
      return new RotorStates(running, storm, design, torque.si(), states, operation(ct), steps);
    }

    private double ratedCt() {
      Turbine.Rated r = turbine.rated();
      Step cp =
          ActuatorDisc.POWER_COEFFICIENT.at(
              r.power_W(), efficiency, wind.density_kgpm3(), area_m2, r.wind_mps());
      double a = ActuatorDisc.inductionForCp(cp.si());
      Step ct = ActuatorDisc.CT.at(a);
      steps.add(cp);
      steps.add(ct);
      return ct.si();
    }

    private State running(String name, double v, double omega, double power, double ct) {
      Step t = ActuatorDisc.THRUST.at(ct, wind.density_kgpm3(), area_m2, v);
      steps.add(t);
      return new State(name, v, omega, power, t.si(), ct, "momentum theory");
    }

    /** Full thrust is met up to here: furling takes seconds, a gust does not wait. */
    private double greatestRunningWind() {
      double rated = turbine.rated().wind_mps();
      double furl = turbine.furl().map(Turbine.Furl::complete_mps).orElse(rated);
      return Math.max(rated, Math.max(furl, turbine.cutOut_mps().orElse(rated)));
    }

    private State storm() {
      List<State> storms = new ArrayList<>();
      if (turbine.parked() != Turbine.Parked.SPINNING) {
        Step s =
            IecRotorLoads.CASE_H_PARKED.at(
                rotor.blades(),
                IecRotorLoads.PARKED_CD,
                wind.density_kgpm3(),
                wind.gust50_mps(),
                rotor.areaPerBlade_m2());
        steps.add(s);
        storms.add(state("storm, stopped", 0, s, "IEC case H, blades broadside"));
      }
      if (turbine.parked() != Turbine.Parked.STOPPED) {
        double omega = stormSpeed();
        Step ratio = IecRotorLoads.TIP_SPEED_RATIO.at(omega, rotor.radius_m(), wind.gust50_mps());
        Step s =
            IecRotorLoads.CASE_H_SPINNING.at(
                rotor.blades(),
                rotor.areaPerBlade_m2(),
                ratio.si(),
                wind.density_kgpm3(),
                wind.gust50_mps());
        steps.add(ratio);
        steps.add(s);
        storms.add(state("storm, spinning", omega, s, "IEC case H, spinning"));
      }
      states.addAll(storms);
      return storms.stream().max(Comparator.comparingDouble(State::thrust_N)).orElseThrow();
    }

    private State state(String name, double omega, Step thrust, String how) {
      double q = 0.5 * wind.density_kgpm3() * wind.gust50_mps() * wind.gust50_mps();
      return new State(
          name, wind.gust50_mps(), omega, 0, thrust.si(), thrust.si() / (q * area_m2), how);
    }

    /** The least of running free at the storm wind, a stated runaway and the tip cap. */
    private double stormSpeed() {
      double free =
          RUNAWAY_OVER_DESIGN * rotor.tipSpeedRatio() * wind.gust50_mps() / rotor.radius_m();
      double omega = Math.min(free, GREATEST_TIP_MPS / rotor.radius_m());
      if (turbine.rotorSpeed().runaway_radps().isPresent()) {
        omega = Math.min(omega, turbine.rotorSpeed().runaway_radps().getAsDouble());
      }
      steps.add(
          Step.given(
              "Ω",
              "least of twice the design tip-speed ratio at V_e50, a stated runaway, 250 m/s tip",
              omega,
              Unit.RADPS,
              CAP));
      return omega;
    }

    private List<State> operation(double ct) {
      List<State> rows = new ArrayList<>();
      Turbine.Rated r = turbine.rated();
      double from = turbine.cutIn_mps().orElse(r.wind_mps() / 3);
      double to = greatestRunningWind();
      int count = 24;
      for (int i = 0; i <= count; i++) {
        double v = from + (to - from) * i / count;
        double share = Math.min(1, v / r.wind_mps());
        double omega = Math.max(turbine.rotorSpeed().lowest_radps(), r.omega_radps() * share);
        double power = r.power_W() * share * share * share;
        double thrust = ct * 0.5 * wind.density_kgpm3() * area_m2 * v * v;
        rows.add(
            new State(
                v <= r.wind_mps() ? "below rated" : "above rated, full thrust",
                v,
                Math.min(omega, turbine.rotorSpeed().highest_radps()),
                power,
                thrust,
                ct,
                "momentum theory"));
      }
      return rows;
    }
  }
}
