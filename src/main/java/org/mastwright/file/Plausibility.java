package org.mastwright.file;

import java.util.List;
import org.mastwright.design.GuySet;
import org.mastwright.design.Rotor;
import org.mastwright.design.Tower;
import org.mastwright.design.Turbine;
import org.mastwright.units.Unit;

/** Doubts that can be told from the numbers alone, each with its number. */
final class Plausibility {
  private static final double LEAST_BELOW_BLADES_M = 0.3;

  private Plausibility() {}

  static void check(Key top, Tower tower, Turbine turbine, Faults faults) {
    Rotor rotor = turbine.rotor();
    double lowest = tower.topHeight_m() + turbine.head().hubAboveTop_m() - rotor.radius_m();
    List<GuySet> guys = tower.guys();
    for (GuySet set : guys) {
      double height = tower.footLevel_m() + set.along_m();
      if (height > lowest - LEAST_BELOW_BLADES_M) {
        Key at =
            top.get("tower")
                .flatMap(t -> t.get("guys"))
                .map(Key::items)
                .orElseThrow()
                .get(set.number() - 1);
        at.error(
            "E10",
            Unit.M.print(height)
                + ": the blades sweep down to "
                + Unit.M.print(lowest)
                + " here, and the guys would be struck.",
            "The guy may be at most "
                + Unit.M.print(lowest - LEAST_BELOW_BLADES_M)
                + ", or the rotor must stand higher.");
      }
    }
    double loading = turbine.rated().power_W() / rotor.sweptArea_m2();
    range(
        top, faults, "turbine.rated.power", "rated power over swept area, W/m²", loading, 100, 350);
    double heavy = turbine.mass_kg() / rotor.sweptArea_m2();
    range(top, faults, "turbine.mass", "mass over swept area, kg/m²", heavy, 8, 40);
    range(
        top,
        faults,
        "turbine.rotor.tip-speed-ratio",
        "tip-speed ratio",
        rotor.tipSpeedRatio(),
        3,
        10);
    if (!guys.isEmpty()) {
      double above = tower.length_m() - guys.get(guys.size() - 1).along_m();
      range(
          top,
          faults,
          "tower.guys",
          "mast above the top guys over its length",
          above / tower.length_m(),
          0,
          0.25);
    }
    if (tower.dampingRatio() > 0.01) {
      Key at = top.get("tower").orElseThrow();
      faults.warning(
          "E18",
          at,
          Unit.PERCENT.print(tower.dampingRatio())
              + ": bare welded poles have about 0.2 %. Is it the damping ratio?",
          "If 0.012 came from a table of logarithmic decrements, write `log-decrement: 0.012`.");
    }
  }

  private static void range(
      Key top, Faults faults, String path, String what, double value, double low, double high) {
    if (value < low || value > high) {
      faults.warning(
          "unusual",
          top,
          path
              + ": "
              + what
              + " is "
              + Unit.ONE.print(value)
              + "; usual is "
              + Unit.ONE.print(low)
              + " to "
              + Unit.ONE.print(high)
              + ".",
          "Check the numbers.");
    }
  }
}
