package org.mastwright.mast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.mastwright.Source;
import org.mastwright.design.Design;
import org.mastwright.file.Reading;
import org.mastwright.file.TowerFiles;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.Response;
import org.mastwright.frame.Chain;
import org.mastwright.frame.Equilibrium;
import org.mastwright.loads.Combination;
import org.mastwright.loads.LoadModel;
import org.mastwright.loads.PretensionState;

/** Whole towers: known answers, pretension, symmetry, turning, mesh. */
class TowersCrossCheckTest {
  private static Design read(String text) {
    Reading r = TowerFiles.read("t.yaml", text.getBytes(StandardCharsets.UTF_8));
    return r.design().orElseThrow(() -> new AssertionError(r.faults().toString()));
  }

  private static String example(String name) throws IOException {
    return Files.readString(Path.of("examples", name + ".yaml"));
  }

  @Test
  @Source(
      key = "elastic catenary, two independent scripts",
      locator = "value 7.15",
      status = "recomputed")
  void value7_15_twoGuysInAPlane() throws IOException {
    VerificationRun run = VerificationRun.run(read(example("two-guys")));
    double[] windward = {6723, 10585, 15296};
    double[] leeward = {3386, 575, 270};
    double[] moved_mm = {9.76, 32.25, 59.68};
    for (int i = 0; i < 3; i++) {
      Response r = run.responses().get(i);
      double east = r.guys().get(0).tensionAtMast_N();
      double west = r.guys().get(1).tensionAtMast_N();
      assertEquals(windward[i], west, 0.003 * windward[i]);
      assertEquals(leeward[i], east, 0.003 * leeward[i]);
      assertEquals(moved_mm[i], r.top().east_m() * 1000, 0.003 * moved_mm[i]);
    }
  }

  private static final String POLE =
      """
      tower-file: 1
      project: {title: "bar", units: SI}
      tower:
        kind: monopole
        base: fixed
        tubes:
          - {length: %s, outside: {bottom: %s, top: %s}, wall: {bottom: %s, top: %s}, steel: {yield: 355 MPa, ultimate: 470 MPa, modulus: 210 GPa, density: 8500 kg/m^3}}
      verification:
        gravity: %s m/s^2
        shear-flexible: false
        elements: 80
        head: {mass: %s kg}
        cases: [{id: V1}]
      """;

  private static double first(String gravity, String head, int mode) {
    Design d =
        read(
            String.format(
                java.util.Locale.ROOT,
                POLE,
                "87.6 m",
                "6 m",
                "3.87 m",
                "35.1 mm",
                "24.7 mm",
                gravity,
                head));
    return VerificationRun.run(d).modes().get(0).modes().get(mode).frequency_Hz();
  }

  @Test
  @Source(
      key = "NREL/TP-500-38060",
      locator = "Table 6-1, values 9.2, 9.3",
      status = "read; frequencies recomputed")
  void value9_2_fiveMegawattTower() {
    assertEquals(0.8914, first("0", "0.001", 0), 1e-3 * 0.8914);
    assertEquals(4.375, first("0", "0.001", 2), 1e-3 * 4.375);
    assertEquals(0.3365, first("0", "350000", 0), 2e-3 * 0.3365);
    assertEquals(0.3307, first("9.80665", "350000", 0), 2e-3 * 0.3307);
  }

  @Test
  void mastStandsPlumbWithTheTensionsThatWereSet() throws IOException {
    Design d = read(example("ridge-school"));
    MastModel model = MastModel.of(d);
    double[] set = {4000, 4500, 7000};
    for (int s = 1; s <= 3; s++) {
      double found = model.stillAirTension_N(PretensionState.NOMINAL, s, 0).orElseThrow();
      assertEquals(set[s - 1], found, 1e-5 * set[s - 1]);
    }
    Equilibrium still = model.stillAir(PretensionState.NOMINAL);
    for (GuyPlaces.Place g : model.guys().all()) {
      Chain.Point moved = still.movement_m(g.node());
      assertEquals(0, Math.hypot(moved.x_m(), moved.y_m()), 1e-6);
    }
  }

  private static Response storm(Design d, double windFrom_rad) {
    Combination storm =
        LoadModel.of(d).combinations().stream()
            .filter(c -> c.code().equals("I6"))
            .findFirst()
            .orElseThrow();
    return MastModel.of(d).solve(storm.at(windFrom_rad, storm.variants().get(1)));
  }

  @Test
  void turnedTowerGivesTurnedAnswers() throws IOException {
    String text = example("ridge-school");
    Response straight = storm(read(text), Math.toRadians(30));
    String turned = text;
    for (int bearing : new int[] {270, 180, 90, 0}) {
      turned =
          turned.replace(
              "bearing: " + bearing + " deg, out", "bearing: " + (bearing + 45) + " deg, out");
    }
    Response after = storm(read(turned), Math.toRadians(75));
    assertEquals(straight.top().level_m(), after.top().level_m(), 1e-9);
    assertEquals(straight.greatestMoment().moment_Nm(), after.greatestMoment().moment_Nm(), 1e-4);
    for (int i = 0; i < straight.guys().size(); i++) {
      GuyForces a = straight.guys().get(i);
      GuyForces b = after.guys().get(i);
      assertEquals(a.tensionAtMast_N(), b.tensionAtMast_N(), 1e-6 * a.tensionAtMast_N());
    }
  }

  @Test
  void symmetricTowerAnswersSymmetrically() throws IOException {
    Response r = storm(read(example("ridge-school")), 0);
    assertEquals(0, r.top().east_m(), 1e-6);
    assertTrue(r.top().north_m() < 0, "wind from north pushes south");
    assertEquals(r.guys().get(1).tensionAtMast_N(), r.guys().get(3).tensionAtMast_N(), 0.5);
  }

  @Test
  void finerMeshMovesNoAnswerByATenthOfAPercent() throws IOException {
    String text =
        example("two-guys")
            .replace("outside: 2 m, wall: 100 mm", "outside: 114.3 mm, wall: 4 mm")
            .replace("base: {hinged: {axis: 0 deg}}", "base: fixed");
    Design usual = read(text);
    Design fine = read(text.replace("verification:", "verification:\n  elements: 200"));
    VerificationRun a = VerificationRun.run(usual);
    VerificationRun b = VerificationRun.run(fine);
    for (int i = 0; i < 3; i++) {
      Response x = a.responses().get(i);
      Response y = b.responses().get(i);
      assertEquals(1, x.top().east_m() / y.top().east_m(), 1e-3);
      assertEquals(1, x.greatestMoment().moment_Nm() / y.greatestMoment().moment_Nm(), 1e-3);
    }
    assertEquals(
        1,
        a.modes().get(0).modes().get(0).frequency_Hz()
            / b.modes().get(0).modes().get(0).frequency_Hz(),
        1e-3);
  }

  private static double set(String tension) throws IOException {
    String text =
        example("ridge-school").replace("tension: 4 kN, tension-at: anchor", "tension: " + tension);
    return MastModel.of(read(text)).stillAirTension_N(PretensionState.NOMINAL, 1, 0).orElseThrow();
  }

  /** Share: a tenth of 53 kN. Pulse: T = m (2 L N / t)². Sag: w l L / 8 s, within the parabola. */
  @Test
  void tensionIsSetByShareByPulseAndBySag() throws IOException {
    double chord = Math.hypot(14 - 0.1397 / 2, 7.5);
    assertEquals(5300, set("10 % of breaking"), 0.1);
    double speed = 2 * chord * 10 / 3.0;
    assertEquals(0.316 * speed * speed, set("{pulse: {returns: 10, time: 3 s}}"), 0.1);
    double weight = 0.316 * 9.80665;
    double parabola = weight * (14 - 0.1397 / 2) * chord / (8 * 0.03);
    assertEquals(1, set("{sag: 30 mm}") / parabola, 0.01);
  }

  @Test
  void slopingGroundStillLeavesTheMastPlumb() throws IOException {
    String text =
        example("ridge-school")
            .replace(
                "{name: e, bearing: 90 deg, out: 14 m, eye: 0 m",
                "{name: e, bearing: 90 deg, out: 12 m, eye: -1.5 m")
            .replace(
                "{name: w, bearing: 270 deg, out: 14 m, eye: 0 m",
                "{name: w, bearing: 270 deg, out: 15 m, eye: 1 m");
    MastModel model = MastModel.of(read(text));
    assertEquals(4000, model.stillAirTension_N(PretensionState.NOMINAL, 1, 0).orElseThrow(), 0.1);
    Equilibrium still = model.stillAir(PretensionState.NOMINAL);
    for (GuyPlaces.Place g : model.guys().all()) {
      Chain.Point moved = still.movement_m(g.node());
      assertEquals(0, Math.hypot(moved.x_m(), moved.y_m()), 1e-6);
    }
  }
}
