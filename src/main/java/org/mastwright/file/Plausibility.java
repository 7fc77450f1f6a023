package org.mastwright.file;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import java.util.Optional;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.design.Rotor;
import org.mastwright.design.SiteWind;
import org.mastwright.design.Tower;
import org.mastwright.design.Tube;
import org.mastwright.design.Turbine;
import org.mastwright.units.Dimension;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;

/**
 * Doubts that can be told from the numbers alone, each with its number. Common practice, no source:
 * the ranges are those of machines and masts that are sold.
 */
final class Plausibility {
  /** Guys nearer to the circle of the blade tips than this would be struck. */
  private static final double LEAST_BELOW_BLADES_M = 0.3;

  private static final double WELDED_DAMPING_RATIO = 0.01;

  private final Key top;
  private final Faults faults;
  private final Tower tower;

  private Plausibility(Key top, Tower tower) {
    this.top = top;
    this.faults = top.faults();
    this.tower = tower;
  }

  static void check(Key top, Design design) {
    Plausibility doubts = new Plausibility(top, design.tower());
    design.turbine().ifPresent(doubts::machine);
    design.site().ifPresent(s -> doubts.wind(s.wind()));
    doubts.tubes();
    doubts.guys(design.ground());
    doubts.damping();
  }

  private Key key(String path) {
    Key at = top;
    for (String word : path.split("\\.")) {
      Optional<Key> next = at.get(word);
      if (next.isEmpty()) {
        return at;
      }
      at = next.get();
    }
    return at;
  }

  private Key item(String list, int number) {
    List<Key> items = key(list).items();
    return items.get(Math.min(number, items.size()) - 1);
  }

  private void machine(Turbine turbine) {
    Rotor rotor = turbine.rotor();
    belowTheBlades(tower.topHeight_m() + turbine.head().hubAboveTop_m() - rotor.radius_m());
    double disc = rotor.sweptArea_m2();
    range(
        key("turbine.rated.power"),
        "Rated power over swept area is",
        Unit.ONE.print(turbine.rated().power_W() / disc) + " W/m²",
        turbine.rated().power_W() / disc,
        100,
        350,
        "100 to 350 W/m²");
    range(
        key("turbine.mass"),
        "Mass over swept area is",
        Unit.ONE.print(turbine.mass_kg() / disc) + " kg/m²",
        turbine.mass_kg() / disc,
        8,
        40,
        "8 to 40 kg/m²");
    double[] ratio =
        switch (rotor.kind()) {
          case PROPELLER -> new double[] {3, 10};
          case STRAIGHT_BLADED, DARRIEUS -> new double[] {1.5, 5};
          default -> new double[] {0.6, 2};
        };
    range(
        key("turbine.rotor.tip-speed-ratio"),
        "The tip-speed ratio is",
        Unit.ONE.print(rotor.tipSpeedRatio()),
        rotor.tipSpeedRatio(),
        ratio[0],
        ratio[1],
        ratio[0] + " to " + ratio[1]);
    Key r = key("turbine.rotor");
    if (r.has("solidity") && r.has("area-per-blade")) {
      double stated = r.value("solidity", Dimension.ONE).orElse(0);
      double sum = rotor.blades() * rotor.areaPerBlade_m2() / disc;
      range(
          key("turbine.rotor.solidity"),
          "The blades together cover",
          Unit.PERCENT.print(sum)
              + " of the swept area, against a solidity of "
              + Unit.PERCENT.print(stated),
          sum / stated,
          0.85,
          1.15,
          "within 15 %");
    }
  }

  private void belowTheBlades(double lowest_m) {
    for (GuySet set : tower.guys()) {
      double height = tower.footLevel_m() + set.along_m();
      double most = lowest_m - LEAST_BELOW_BLADES_M;
      if (height > most) {
        Key guy = item("tower.guys", set.number());
        boolean along = guy.has("up-the-mast");
        Key at = guy.get(along ? "up-the-mast" : "height").orElse(guy);
        double zero = along ? tower.footLevel_m() : 0;
        at.error(
            "E10",
            at.text()
                + ": the blades sweep down to "
                + at.alike(lowest_m - zero, Dimension.LENGTH)
                + " here, and the guys would be struck.",
            (set.number() == tower.guys().size() ? "The top guy" : "The guy")
                + " may be at most "
                + at.atMost(most - zero, Dimension.LENGTH)
                + ", or the rotor must stand higher.");
      }
    }
  }

  private void wind(SiteWind wind) {
    if (wind.stated() instanceof SiteWind.Stated.Speed s) {
      Key at = key("site.wind.reference.speed");
      String typed = at.isScalar() ? at.text() : Unit.MPS.print(s.speed_mps());
      if (s.averaging() == SiteWind.Averaging.GUST_3_S
          && s.level() instanceof SiteWind.Level.Ultimate) {
        range(
            at,
            "The ultimate 3 s gust is",
            typed,
            Unit.MPH.fromSi(s.speed_mps()),
            85,
            200,
            "85 to 200 mph");
      } else if (s.averaging() == SiteWind.Averaging.TEN_MINUTES
          && s.level().returnPeriod_yr() == 50) {
        range(at, "The 10 min mean of 50 years is", typed, s.speed_mps(), 18, 45, "18 to 45 m/s");
      }
    }
  }

  private void tubes() {
    for (int i = 0; i < tower.tubes().size(); i++) {
      Tube t = tower.tubes().get(i);
      double ratio = t.bottom().wall_m() / t.bottom().outside_m();
      range(
          item("tower.tubes", i + 1),
          "The outside over the wall is",
          Unit.ONE.print(1 / ratio),
          ratio,
          1.0 / 100,
          1.0 / 8,
          "8 to 100");
    }
  }

  private void guys(Ground ground) {
    List<GuySet> guys = tower.guys();
    if (guys.isEmpty()) {
      return;
    }
    double above = tower.length_m() - guys.get(guys.size() - 1).along_m();
    range(
        item("tower.guys", guys.size()),
        "The mast stands above its top guys by",
        Unit.PERCENT.print(above / tower.length_m()) + " of its length",
        above / tower.length_m(),
        0,
        0.25,
        "up to 25 %");
    for (GuySet set : guys) {
      Key at = item("tower.guys", set.number());
      for (GuySet.Guy g : set.guys()) {
        Ground.Anchor a = ground.anchors().get(g.anchor());
        double ratio = a.out_m() / (tower.footLevel_m() + set.along_m() - a.up_m());
        // lower levels that share the top level's anchors lie flatter, and may
        range(
            at,
            "Anchor " + a.name() + " lies out by",
            Numbers.fixed(ratio, 2) + " of the height of these guys above it",
            set == guys.get(guys.size() - 1) ? ratio : Math.min(ratio, 1.2),
            0.35,
            1.2,
            "0.35 to 1.2");
      }
      tension(at, set);
    }
  }

  private void tension(Key at, GuySet set) {
    double least = Double.POSITIVE_INFINITY;
    double greatest = 0;
    if (set.tension() instanceof GuySet.Tension.OfBreaking share) {
      least = share.fraction();
      greatest = share.fraction();
    } else if (set.tension() instanceof GuySet.Tension.Force force) {
      for (double v : force.values_N()) {
        least = Math.min(least, v / set.rope().breaking_N());
        greatest = Math.max(greatest, v / set.rope().breaking_N());
      }
    } else {
      return;
    }
    double worst = least < 0.005 ? least : greatest;
    range(
        at.get("tension").orElse(at),
        "The tension is",
        Unit.PERCENT.print(worst) + " of breaking",
        worst,
        0.005,
        0.20,
        "0.5 to 20 %");
  }

  private void damping() {
    if (tower.dampingRatio() > WELDED_DAMPING_RATIO) {
      Key at = key("tower.damping-ratio");
      faults.warning(
          "E18",
          at,
          Unit.PERCENT.print(tower.dampingRatio())
              + ": bare welded poles have about 0.2 %. Is it the damping ratio?",
          "If "
              + plain(tower.dampingRatio())
              + " came from a table of logarithmic decrements, write `log-decrement: "
              + plain(tower.dampingRatio())
              + "`.");
    }
  }

  private static String plain(double value) {
    return new BigDecimal(value)
        .round(new MathContext(4, RoundingMode.HALF_UP))
        .stripTrailingZeros()
        .toPlainString();
  }

  private void range(
      Key at, String what, String number, double value, double low, double high, String usual) {
    if (!(value >= low && value <= high)) {
      faults.warning(
          "unusual", at, what + " " + number + "; usual is " + usual + ".", "Check the numbers.");
    }
  }
}
