package org.mastwright.checks.guy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.mastwright.checks.anchor.AnchorChecks;
import org.mastwright.design.Design;
import org.mastwright.design.GuySet;
import org.mastwright.file.TowerFiles;
import org.mastwright.forces.BaseReaction;
import org.mastwright.forces.CaseMark;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.forces.TopMovement;
import org.mastwright.forces.Vector3;
import org.mastwright.working.Check;
import org.mastwright.working.Outcome;

/** Guys and anchors against the arithmetic of a page of notes. */
class GuysAndAnchorsCrossCheckTest {
  private static Design design(String from, String to) throws IOException {
    String text = Files.readString(Path.of("examples/ridge-school.yaml")).replace(from, to);
    return TowerFiles.read("t.yaml", text.getBytes(StandardCharsets.UTF_8)).design().orElseThrow();
  }

  private static Design design() throws IOException {
    return design("", "");
  }

  /** Every guy with one tension; the guy at the first anchor pulls {@code north_N}. */
  private static Response response(
      Design d, LimitState state, boolean running, double tension_N, double north_N) {
    List<GuyForces> guys = new ArrayList<>();
    for (GuySet set : d.tower().guys()) {
      for (int i = 0; i < set.guys().size(); i++) {
        double level = i == 0 ? north_N : 3000;
        guys.add(
            new GuyForces(
                set.number(),
                i,
                set.guys().get(i).azimuth_rad(),
                set.guys().get(i).anchor(),
                tension_N,
                tension_N - 10,
                new Vector3(0, -level, 4000),
                3000,
                false,
                false,
                List.of()));
      }
    }
    CaseMark mark = new CaseMark("X-0", "X", "x", "x", state, 0, 0, running);
    return new Response(
        mark,
        List.of(),
        guys,
        new BaseReaction(0, 0, 0, 0, 0, 0),
        new TopMovement(0, 0, 0, 0, 0, 0),
        0,
        1,
        true,
        1,
        Optional.empty());
  }

  private static Check find(List<Check> checks, String id) {
    return checks.stream().filter(c -> c.subject().id().equals(id)).findFirst().orElseThrow();
  }

  /** 53 kN, swaged 0.9, over 1.1 = 43.364 kN. */
  @Test
  void guyResistanceTakesTheEnds() throws IOException {
    Design d = design();
    Check c =
        find(
            GuyChecks.of(d, List.of(response(d, LimitState.STRENGTH, false, 40e3, 3000))),
            "guy-strength");
    assertEquals(40 / 43.363636, c.utilisation().orElseThrow(), 1e-6);
    assertEquals(Outcome.PASS, c.outcome());
    Check over =
        find(
            GuyChecks.of(d, List.of(response(d, LimitState.STRENGTH, false, 43.4e3, 3000))),
            "guy-strength");
    assertEquals(Outcome.FAIL, over.outcome());
  }

  @Test
  void hardwareWithoutItsFactorIsNotAssessed() throws IOException {
    Design d =
        design(
            "tension: 4 kN, tension-at: anchor",
            "tension: 4 kN, tension-at: anchor, hardware: [{what: shackle, working-load: 9 kN}]");
    Check c =
        find(
            GuyChecks.of(d, List.of(response(d, LimitState.STRENGTH, false, 40e3, 3000))),
            "guy-hardware");
    assertEquals(Outcome.NOT_ASSESSED, c.outcome());
  }

  @Test
  void workingLoadTimesItsFactorBreaks() throws IOException {
    Design d =
        design(
            "tension: 4 kN, tension-at: anchor",
            "tension: 4 kN, tension-at: anchor, hardware: [{what: shackle, working-load: 9 kN, safety: 5}]");
    Check c =
        find(
            GuyChecks.of(d, List.of(response(d, LimitState.STRENGTH, false, 40e3, 3000))),
            "guy-hardware");
    assertEquals(40 / (45 / 1.1), c.utilisation().orElseThrow(), 1e-9);
  }

  /** A tenth of 3000 N must be left. */
  @Test
  void slackGuyFailsWhileTheRotorRuns() throws IOException {
    Design d = design();
    Check taut =
        find(
            GuyChecks.of(d, List.of(response(d, LimitState.SERVICE, true, 5e3, 301))), "guy-slack");
    Check slack =
        find(
            GuyChecks.of(d, List.of(response(d, LimitState.SERVICE, true, 5e3, 299))), "guy-slack");
    Check none =
        find(GuyChecks.of(d, List.of(response(d, LimitState.SERVICE, true, 5e3, 0))), "guy-slack");
    assertEquals(Outcome.PASS, taut.outcome());
    assertEquals(Outcome.FAIL, slack.outcome());
    assertEquals(Outcome.FAIL, none.outcome());
    assertTrue(GuyChecks.of(d, List.of(response(d, LimitState.SERVICE, false, 5e3, 0))).isEmpty());
  }

  /** Three guys of (3 kN level, 4 kN up) at one anchor: 15 kN, against 90 kN over 1.1. */
  @Test
  void pullsAtOneAnchorAddAsVectors() throws IOException {
    Design d = design();
    List<Check> checks =
        AnchorChecks.of(d, List.of(response(d, LimitState.STRENGTH, false, 5e3, 3000)));
    assertEquals(4, checks.size());
    for (Check c : checks) {
      assertEquals(15 / (90 / 1.1), c.utilisation().orElseThrow(), 1e-9);
    }
  }

  @Test
  void anchorThatGaveWayIsNeverACapacity() throws IOException {
    Design d = design("failed: no", "failed: yes");
    for (Check c :
        AnchorChecks.of(d, List.of(response(d, LimitState.STRENGTH, false, 5e3, 3000)))) {
      assertEquals(Outcome.NOT_ASSESSED, c.outcome());
    }
  }
}
