package org.mastwright.file;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.CaseResult;
import org.mastwright.assess.ModeResult;
import org.mastwright.assess.Reactions;
import org.mastwright.assess.RotorResult;
import org.mastwright.assess.SpeedResult;
import org.mastwright.assess.Verdict;
import org.mastwright.forces.BaseReaction;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.forces.SectionForces;
import org.mastwright.forces.Vector3;
import org.mastwright.working.Check;
import org.mastwright.working.Finding;
import tools.jackson.databind.ObjectMapper;
import tools.jackson.databind.SerializationFeature;
import tools.jackson.databind.json.JsonMapper;

/**
 * results.json: SI with the unit in the key, keys in a fixed order, no number that is not finite.
 */
public final class ResultsJson {
  private static final double RPM = Math.PI / 30;

  private ResultsJson() {}

  /** The bytes of the file. */
  public static byte[] bytes(Assessment a) {
    ObjectMapper mapper = JsonMapper.builder().enable(SerializationFeature.INDENT_OUTPUT).build();
    String text = mapper.writeValueAsString(root(a)).replace("\r\n", "\n");
    return (text + "\n").getBytes(StandardCharsets.UTF_8);
  }

  private static Object finite(double v) {
    return Double.isFinite(v) ? v : null;
  }

  private static Object finite(OptionalDouble v) {
    return v.isPresent() ? finite(v.getAsDouble()) : null;
  }

  private static Map<String, Object> map(Object... pairs) {
    Map<String, Object> m = new LinkedHashMap<>();
    for (int i = 0; i < pairs.length; i += 2) {
      Object v = pairs[i + 1];
      m.put((String) pairs[i], v instanceof Double d ? finite(d) : v);
    }
    return m;
  }

  private static Map<String, Object> root(Assessment a) {
    Map<String, Object> m = new LinkedHashMap<>();
    m.put("program", map("name", "mastwright", "version", a.version()));
    m.put(
        "input",
        map(
            "file", a.input().name(),
            "sha256", a.input().sha256(),
            "defaults",
                a.defaults().stream()
                    .map(
                        d ->
                            map(
                                "path",
                                d.path(),
                                "value",
                                d.value(),
                                "source",
                                d.source(),
                                "side",
                                d.side().word()))
                    .toList()));
    m.put("verdict", a.verdict().word());
    boolean verification = a.verdict() == Verdict.VERIFICATION;
    Optional<Check> worst = verification ? Optional.empty() : a.governing();
    m.put(
        "governing",
        worst
            .map(c -> map("check", c.subject().id(), "utilisation", finite(c.utilisation())))
            .orElse(null));
    m.put("checks", a.checks().stream().map(ResultsJson::check).toList());
    m.put("cases", a.cases().stream().map(c -> oneCase(a, c)).toList());
    m.put("anchors", a.reactions().anchors().stream().map(ResultsJson::anchor).toList());
    m.put("modes", a.modes().stream().map(ResultsJson::mode).toList());
    m.put(
        "buckling",
        a.buckling().stream()
            .map(b -> map("case", b.caseId(), "critical_factor", b.criticalFactor()))
            .toList());
    m.put("limit_points", limits(a));
    a.rotor().ifPresent(r -> m.put("rotor", rotor(r)));
    a.speeds().ifPresent(s -> m.put("rotor_speed", speeds(s)));
    m.put("raising", List.of());
    m.put("open_points", messages(a, Finding.Severity.OPEN_POINT));
    m.put("warnings", messages(a, Finding.Severity.WARNING));
    m.put(
        "self_check",
        map(
            "equilibrium", a.selfCheck().equilibriumRatio(),
            "mode_count", a.selfCheck().modeCount(),
            "second_method", a.selfCheck().secondMethodRatio()));
    m.put("exit_code", a.exitCode());
    return m;
  }

  private static List<String> messages(Assessment a, Finding.Severity severity) {
    return a.findings(severity).stream()
        .map(f -> f.path().isEmpty() ? f.message() : f.path() + ": " + f.message())
        .distinct()
        .toList();
  }

  private static Map<String, Object> check(Check c) {
    double demand = Double.NaN;
    double capacity = Double.NaN;
    String unit = "";
    String reason = null;
    if (c instanceof Check.Limit l) {
      demand = l.demand().si();
      capacity = l.capacity().si();
      unit = SiUnits.of(l.demand().unit());
    } else if (c instanceof Check.Interaction i) {
      demand = i.sum().si();
      capacity = 1;
    } else if (c instanceof Check.Separation s) {
      demand = s.required().si();
      capacity = s.distance().si();
      unit = SiUnits.of(s.required().unit());
    } else if (c instanceof Check.NotAssessed n) {
      reason = n.reason();
    }
    return map(
        "id", c.subject().id(),
        "title", c.subject().title(),
        "clause", c.clause().cite(),
        "status", c.clause().status().word(),
        "case", c.subject().caseId(),
        "where", c.subject().where(),
        "demand", demand,
        "capacity", capacity,
        "unit", unit,
        "utilisation", finite(c.utilisation()),
        "outcome", c.outcome().word(),
        "reason", reason);
  }

  private static Map<String, Object> base(BaseReaction b) {
    return map(
        "east_N", b.east_N(),
        "north_N", b.north_N(),
        "up_N", b.up_N(),
        "moment_about_east_Nm", b.momentAboutEast_Nm(),
        "moment_about_north_Nm", b.momentAboutNorth_Nm(),
        "torque_Nm", b.torque_Nm());
  }

  /** Forces along the mast stand with the cases that govern something, and with verification. */
  private static Map<String, Object> oneCase(Assessment a, CaseResult c) {
    Response r = c.response();
    SectionForces most = r.greatestMoment();
    boolean all = r.mark().limitState() == LimitState.VERIFICATION || !c.governs().isEmpty();
    Map<String, Object> m =
        map(
            "id", r.mark().id(),
            "title", r.mark().title(),
            "basis", r.mark().basis(),
            "wind_from_deg", Math.toDegrees(r.mark().windFrom_rad()),
            "thrust_N", r.mark().thrust_N(),
            "top",
                map(
                    "east_m", r.top().east_m(),
                    "north_m", r.top().north_m(),
                    "up_m", r.top().up_m(),
                    "tilt_rad", r.top().tilt_rad(),
                    "twist_rad", r.top().twist_rad()),
            "base", base(r.base()),
            "greatest_moment", map("Nm", most.moment_Nm(), "height_m", most.height_m()),
            "guys", r.guys().stream().filter(g -> !g.removed()).map(ResultsJson::guy).toList(),
            "forces", all ? r.stations().stream().map(ResultsJson::station).toList() : List.of(),
            "residual", r.residual(),
            "iterations", r.iterations());
    m.put("governs", c.governs());
    m.put("equilibrium_at", r.converged() ? 1.0 : r.reachedFactor());
    return m;
  }

  private static Map<String, Object> guy(GuyForces g) {
    return map(
        "set", g.set(),
        "azimuth_deg",
            Math.toDegrees(g.azimuth_rad() < 0 ? g.azimuth_rad() + 2 * Math.PI : g.azimuth_rad()),
        "tension_at_mast_N", g.tensionAtMast_N(),
        "tension_at_anchor_N", g.tensionAtAnchor_N(),
        "slack", g.slack());
  }

  private static Map<String, Object> station(SectionForces s) {
    return map(
        "height_m", s.height_m(),
        "axial_N", s.axial_N(),
        "shear_N", s.shear_N(),
        "moment_Nm", s.moment_Nm(),
        "torque_Nm", s.torque_Nm(),
        "east_m", s.east_m(),
        "north_m", s.north_m());
  }

  private static Map<String, Object> anchor(Reactions.AnchorPull p) {
    Vector3 f = p.factored_N();
    List<Object> guys = new ArrayList<>();
    p.guys().forEach(g -> guys.add(List.of(g.set(), Math.toDegrees(g.azimuth_rad()))));
    return map(
        "name", p.name(),
        "guys", guys,
        "pull_N", f.length(),
        "azimuth_deg", Math.toDegrees(f.bearing_rad()),
        "elevation_deg", Math.toDegrees(Math.atan2(f.up(), f.level())),
        "case", p.caseId(),
        "unfactored_pull_N", p.unfactored_N().length());
  }

  private static Map<String, Object> mode(ModeResult m) {
    return map(
        "state", m.state(),
        "number", m.number(),
        "frequency_Hz", m.frequency_Hz(),
        "direction", m.direction(),
        "description", m.description(),
        "hub_participation", m.hubParticipationRatio());
  }

  private static List<Object> limits(Assessment a) {
    List<Object> all = new ArrayList<>();
    for (CaseResult c : a.cases()) {
      c.response()
          .limit()
          .ifPresent(
              l ->
                  all.add(
                      map(
                          "case", c.response().mark().id(),
                          "factor", l.factor(),
                          "lost_at", finite(l.lost()))));
    }
    return all;
  }

  private static Map<String, Object> rotor(RotorResult r) {
    return map(
        "model", r.model(),
        "curve", List.of(),
        "operation",
            r.operation().stream()
                .map(
                    p ->
                        map(
                            "wind_mps", p.wind_mps(),
                            "speed_radps", p.speed_radps(),
                            "power_W", p.power_W(),
                            "thrust_N", p.thrust_N(),
                            "ct", p.ctCoefficient(),
                            "state", p.state()))
                .toList());
  }

  private static Map<String, Object> speeds(SpeedResult s) {
    return map(
        "orders", s.orders(),
        "windows_to_avoid_rpm",
            s.windowsToAvoid().stream()
                .map(w -> List.of(w.from_radps() / RPM, w.to_radps() / RPM))
                .toList(),
        "clear_ranges_rpm",
            s.clear().stream().map(w -> List.of(w.from_radps() / RPM, w.to_radps() / RPM)).toList(),
        "watch", s.remarks());
  }
}
