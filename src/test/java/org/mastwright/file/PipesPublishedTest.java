package org.mastwright.file;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.mastwright.Source;
import org.mastwright.design.Design;
import org.mastwright.design.Section;
import org.mastwright.units.Unit;

/** American pipe as a tower file names it, against the printed table. */
class PipesPublishedTest {
  private static final List<String> SIZES = List.of("2-1/2", "3", "4", "8");
  private static final double[] OUTSIDE_IN = {2.875, 3.500, 4.500, 8.625};
  private static final double[] WALL_IN = {0.203, 0.216, 0.237, 0.322};
  private static final double[] SECOND_MOMENT_IN4 = {1.45, 2.85, 6.82, 68.1};

  private static Section pipe(String size) {
    String text =
        """
        tower-file: 1
        project: {title: "pipe", units: SI}
        tower:
          kind: monopole
          base: fixed
          tubes: [{length: 3 m, pipe: {nominal: %s in, schedule: 40}, steel: A53-B}]
        verification: {cases: [{id: V1}]}
        """
            .replace("%s", size);
    Reading r = TowerFiles.read("t.yaml", text.getBytes(StandardCharsets.UTF_8));
    Design d = r.design().orElseThrow(() -> new AssertionError(r.faults().toString()));
    return d.tower().tubes().get(0).bottom();
  }

  @Test
  @Source(key = "AISC manual", locator = "pipe table, value 6.6", status = "read")
  void value6_6_outsideAndWall() {
    for (int i = 0; i < SIZES.size(); i++) {
      Map<String, String> row = Tables.pipe(SIZES.get(i) + " in", "40").orElseThrow();
      assertEquals(OUTSIDE_IN[i], Double.parseDouble(row.get("OD")), 0);
      assertEquals(WALL_IN[i], Double.parseDouble(row.get("tnom")), 0);
      assertEquals(SECOND_MOMENT_IN4[i], Double.parseDouble(row.get("I")), 0);
      assertEquals(OUTSIDE_IN[i], Unit.IN.fromSi(pipe(SIZES.get(i)).outside_m()), 1e-9);
    }
  }

  /** The table's second moment belongs to the design wall, 0.93 of the nominal one. */
  @Test
  @Source(key = "AISC manual", locator = "pipe table, value 6.6", status = "read")
  void value6_6_secondMoment() {
    for (int i = 0; i < SIZES.size(); i++) {
      double found = Unit.IN4.fromSi(pipe(SIZES.get(i)).secondMoment_m4());
      assertEquals(SECOND_MOMENT_IN4[i], found, 0.01 * SECOND_MOMENT_IN4[i]);
    }
  }
}
