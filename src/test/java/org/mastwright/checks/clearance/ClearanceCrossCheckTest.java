package org.mastwright.checks.clearance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.mastwright.design.Design;
import org.mastwright.file.TowerFiles;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.TopMovement;
import org.mastwright.forces.Vector3;

/** The space the blades sweep, against the places of blade tips set out one by one. */
class ClearanceCrossCheckTest {
  private static final TopMovement PLUMB = new TopMovement(0, 0, 0, 0, 0, 0);

  private static Design tilted() throws java.io.IOException {
    String text =
        Files.readString(Path.of("examples/ridge-school.yaml"))
            .replace("overhang: 0.4 m", "overhang: 0.4 m, tilt: 6 deg, cone: 3 deg");
    return TowerFiles.read("t.yaml", text.getBytes(StandardCharsets.UTF_8)).design().orElseThrow();
  }

  private static GuyForces guyThrough(Vector3 a, Vector3 b) {
    return new GuyForces(1, 0, 0, 0, 1, 1, Vector3.ZERO, 1, false, false, List.of(a, b));
  }

  @Test
  void reachIsTheHypotenuse() {
    assertEquals(5, ClearanceChecks.reach_m(4, 3, 0), 1e-12);
  }

  /** A guy point put exactly at any tip of the tilted, coned rotor is never outside the space. */
  @Test
  void noBladeTipLiesOutsideTheSweptSpace() throws java.io.IOException {
    Design d = tilted();
    double tilt = Math.toRadians(6);
    double cone = Math.toRadians(3);
    double radius = 1.8;
    double overhang = 0.4;
    double hub = 24.4;
    for (int yaw = 0; yaw < 360; yaw += 30) {
      Vector3 ahead = Vector3.towards(Math.toRadians(yaw), 1);
      Vector3 side = Vector3.towards(Math.toRadians(yaw + 90), 1);
      Vector3 shaft = ahead.times(Math.cos(tilt)).plus(new Vector3(0, 0, Math.sin(tilt)));
      Vector3 raised = ahead.times(-Math.sin(tilt)).plus(new Vector3(0, 0, Math.cos(tilt)));
      Vector3 centre = new Vector3(0, 0, hub - overhang * Math.sin(tilt));
      for (int turn = 0; turn < 360; turn += 15) {
        double psi = Math.toRadians(turn);
        Vector3 blade = side.times(Math.sin(psi)).plus(raised.times(Math.cos(psi)));
        for (int sign : new int[] {-1, 1}) {
          Vector3 tip =
              centre
                  .plus(shaft.times(overhang + sign * radius * Math.sin(cone)))
                  .plus(blade.times(radius * Math.cos(cone)));
          double d1 = ClearanceChecks.distance_m(d, PLUMB, guyThrough(tip, tip));
          assertTrue(d1 <= 1e-9, yaw + "/" + turn + ": " + d1);
          assertTrue(d1 > -0.05, "not far inside: " + d1);
        }
      }
    }
  }

  @Test
  void levelGuyBelowIsAsFarAsItsHeightSays() throws java.io.IOException {
    Design d = tilted();
    double centre = 24.4 - 0.4 * Math.sin(Math.toRadians(6));
    double reach = ClearanceChecks.reach_m(1.8, 0.4, Math.toRadians(3));
    GuyForces guy = guyThrough(new Vector3(-8, 0, 20), new Vector3(8, 0, 20));
    assertEquals(centre - 20 - reach, ClearanceChecks.distance_m(d, PLUMB, guy), 1e-9);
  }
}
