package org.mastwright.mast;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.mastwright.Source;
import org.mastwright.design.Design;
import org.mastwright.design.Section;
import org.mastwright.file.Reading;
import org.mastwright.file.TowerFiles;
import org.mastwright.forces.Response;
import org.mastwright.units.Unit;

/** The second-order benchmark of AISC 360 as a verification file. */
class BeamColumnsPublishedTest {
  /**
   * A simple beam is symmetric: its middle keeps its direction, so its half is a cantilever with
   * the end reaction (0.200 kip/ft · 14 ft) and the thrust on its tip. Area (14.1 in²) and second
   * moment (484 in⁴) are the benchmark's.
   */
  private static final String HALF_BEAM =
      """
      tower-file: 1
      project: {title: "half a simple beam", units: SI}
      tower:
        kind: monopole
        base: fixed
        tubes:
          - {length: 14 ft, outside: 16.8400 in, wall: 0.27085 in, steel: {yield: 50 ksi, ultimate: 65 ksi, modulus: 29000 ksi}}
      verification:
        gravity: 0 m/s^2
        shear-flexible: false
        elements: 20
        cases:
          - {id: P0, mast-line-loads: [{from: 0 ft, to: 14 ft, east: -200 lbf/ft}], forces: [{height: 14 ft, east: 2.8 kip}]}
          - {id: P150, mast-line-loads: [{from: 0 ft, to: 14 ft, east: -200 lbf/ft}], forces: [{height: 14 ft, east: 2.8 kip, up: -150 kip}]}
          - {id: P300, mast-line-loads: [{from: 0 ft, to: 14 ft, east: -200 lbf/ft}], forces: [{height: 14 ft, east: 2.8 kip, up: -300 kip}]}
          - {id: P450, mast-line-loads: [{from: 0 ft, to: 14 ft, east: -200 lbf/ft}], forces: [{height: 14 ft, east: 2.8 kip, up: -450 kip}]}
      """;

  private static Design halfBeam() {
    Reading r = TowerFiles.read("t.yaml", HALF_BEAM.getBytes(StandardCharsets.UTF_8));
    return r.design().orElseThrow(() -> new AssertionError(r.faults().toString()));
  }

  @Test
  @Source(
      key = "AISC 360 commentary",
      locator = "C-C2.2 case 1, value 6.21",
      status = "read, recomputed")
  void value6_21_secondOrderSimpleBeam() {
    Section tube = halfBeam().tower().tubes().get(0).bottom();
    assertEquals(484, tube.secondMoment_m4() / Unit.IN4.factor(), 0.1);
    double[] moment_kipIn = {235, 269, 313, 375};
    double[] exactMoment_kipIn = {235.20, 268.89, 313.52, 375.41};
    double[] exactMiddle_in = {0.1971, 0.2246, 0.2611, 0.3116};
    double[] middle_in = {0.197, 0.224, 0.261, 0.311};
    List<Response> found = VerificationRun.run(halfBeam()).responses();
    assertEquals(4, found.size());
    for (int i = 0; i < 4; i++) {
      double moment = Unit.KIPIN.fromSi(found.get(i).base().moment_Nm());
      double middle = Unit.IN.fromSi(found.get(i).top().east_m());
      assertEquals(moment_kipIn[i], moment, 0.005 * moment_kipIn[i]);
      assertEquals(middle_in[i], middle, 0.005 * middle_in[i]);
      assertEquals(exactMoment_kipIn[i], moment, 0.005 * exactMoment_kipIn[i]);
      assertEquals(exactMiddle_in[i], middle, 0.005 * exactMiddle_in[i]);
    }
  }
}
