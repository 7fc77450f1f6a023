package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.Basis;
import org.mastwright.design.Site;
import org.mastwright.design.SiteWind;
import org.mastwright.units.Dimension;
import org.mastwright.units.Unit;
import org.mastwright.working.DefaultTaken.Side;

/** Wind, ice, temperature of the site; soil and earthquake are read and not used. */
final class SiteReader {
  private final Key site;
  private final Faults faults;

  SiteReader(Key site, Optional<Basis> basis) {
    this.site = site;
    this.faults = site.faults();
  }

  Site read() {
    Optional<Key> wind = site.need("wind", "missing", "The wind is not given and never guessed.");
    SiteWind w = wind.map(this::wind).orElse(null);
    Site.Ice ice = site.get("ice").map(this::ice).orElseGet(this::noIceStated);
    Site.Temperature t = temperature();
    site.get("soil")
        .ifPresent(
            k ->
                faults.note(
                    "read-not-used",
                    "site.soil",
                    "Soil: read, not yet used; anchors and footing are listed as not checked."));
    site.get("seismic")
        .ifPresent(
            k ->
                faults.open(
                    "read-not-used",
                    "site.seismic",
                    "An earthquake is stated and not calculated by this version.",
                    "Have it checked by the building code of the place."));
    Site all =
        new Site(
            site.value("altitude", Dimension.LENGTH),
            site.positive("air-density", Dimension.DENSITY),
            w,
            ice,
            t,
            Optional.empty(),
            Optional.empty());
    site.close();
    return all;
  }

  private Site.Ice noIceStated() {
    faults.taken("site.ice", "calculated without", "practice", Side.UNKNOWN);
    faults.open(
        "ice-not-stated",
        "site.ice",
        "Nobody said whether ice forms here; it is calculated without.",
        "Write  ice: {none: true}  where that is so, or the ice of the place.");
    return new Site.Ice.NotStated();
  }

  private Site.Ice ice(Key k) {
    if (k.yes("none", false)) {
      k.close();
      return new Site.Ice.None();
    }
    k.known("kind", "with-wind", "one-sided");
    Site.Ice ice;
    if (k.has("class")) {
      ice = new Site.Ice.IsoClass(k.text("class", ""), Optional.empty(), 0);
    } else {
      double t = k.required("thickness", Dimension.LENGTH, "How thick is the ice?");
      Site.Ice.Kind kind =
          k.text("kind", "glaze").equals("rime") ? Site.Ice.Kind.RIME : Site.Ice.Kind.GLAZE;
      ice = new Site.Ice.Thickness(kind, t, Optional.empty(), 0);
    }
    k.close();
    return ice;
  }

  private Site.Temperature temperature() {
    Optional<Key> k = site.get("temperature");
    double setting = 283.15;
    double lowest = 253.15;
    double highest = 313.15;
    if (k.isEmpty()) {
      faults.taken("site.temperature", "10 / -20 / 40 degC", "practice", Side.NEUTRAL);
      return new Site.Temperature(setting, lowest, highest);
    }
    Site.Temperature t =
        new Site.Temperature(
            k.get().value("setting", Dimension.TEMPERATURE).orElse(setting),
            k.get().value("lowest", Dimension.TEMPERATURE).orElse(lowest),
            k.get().value("highest", Dimension.TEMPERATURE).orElse(highest));
    k.get().close();
    return t;
  }

  private SiteWind wind(Key w) {
    Optional<Key> reference = w.get("reference");
    Optional<Key> named = w.get("class");
    SiteWind.Stated stated = null;
    if (reference.isPresent() && named.isPresent()) {
      w.error(
          "E4",
          "Both `class: " + named.get().text() + "` and a reference speed are given.",
          "Keep the one that describes your site; the machine's own class goes to"
              + " `turbine.certified-class`.");
    } else if (named.isPresent()) {
      stated = iecClass(named.get());
    } else if (reference.isPresent()) {
      stated = reference(reference.get());
    } else {
      w.error("missing", "The extreme wind is not given and never guessed.", "Add `reference:`.");
    }
    Optional<SiteWind.AnnualMean> mean =
        w.get("annual-mean")
            .map(
                k -> {
                  SiteWind.AnnualMean m =
                      new SiteWind.AnnualMean(
                          k.required("speed", Dimension.SPEED, "The mean speed is missing."),
                          k.positive("height", Dimension.LENGTH).orElse(10));
                  k.close();
                  return m;
                });
    String terrain = w.text("terrain", "");
    if (terrain.isEmpty()) {
      faults.taken("site.wind.terrain", "open country", "practice", Side.UNKNOWN);
    }
    SiteWind.Topography land = w.get("topographic").map(this::topography).orElse(null);
    if (land == null) {
      land = new SiteWind.Topography.NotStated();
      faults.taken("site.wind.topographic", "worked out flat", "practice", Side.UNKNOWN);
      faults.open(
          "topography-not-stated",
          "site.wind.topographic",
          "Nobody said whether the ground is flat; on a hill the wind is stronger.",
          "Write  topographic: flat  where that is so, or a factor.");
    }
    w.close();
    return new SiteWind(stated, mean, terrain, land);
  }

  private static SiteWind.Stated iecClass(Key k) {
    Map<String, Double> speeds = Map.of("I", 50.0, "II", 42.5, "III", 37.5, "IV", 30.0);
    if (!speeds.containsKey(k.text())) {
      k.error("choice", "The classes are I, II, III and IV.", "");
      return null;
    }
    return new SiteWind.Stated.IecClass(k.text(), speeds.get(k.text()));
  }

  private SiteWind.Stated reference(Key r) {
    double speed = r.required("speed", Dimension.SPEED, "The wind speed is never guessed.");
    SiteWind.Averaging averaging = null;
    Optional<Key> a =
        r.need(
            "averaging", "missing", "Over what time is the speed averaged? It is never guessed.");
    if (a.isPresent()) {
      for (SiteWind.Averaging x : SiteWind.Averaging.values()) {
        averaging = x.key().equals(a.get().text()) ? x : averaging;
      }
      if (averaging == null) {
        a.get()
            .error(
                "choice",
                "\"" + a.get().text() + "\" is no averaging time known here.",
                "Write 3 s, 1 min, 10 min, 1 h or fastest-mile.");
      }
    }
    SiteWind.Level level = level(r);
    r.known("risk-category");
    if (!r.has("height")) {
      faults.taken("site.wind.reference.height", "10 m", "basis", Side.NEUTRAL);
    }
    SiteWind.Stated stated =
        averaging == null || level == null
            ? null
            : new SiteWind.Stated.Speed(
                speed,
                averaging,
                level,
                r.positive("height", Dimension.LENGTH).orElse(10),
                r.text("terrain", "open"),
                r.text("source", ""));
    r.known("height", "terrain", "source");
    r.close();
    return stated;
  }

  private static SiteWind.Level level(Key r) {
    Optional<Key> level = r.get("level");
    OptionalDouble period = r.positive("return-period", Dimension.TIME);
    if (level.isPresent() == period.isPresent()) {
      r.error(
          "E2",
          level.isPresent()
              ? "Both a level and a return period are given."
              : "This speed could be ultimate or nominal; the difference is 40 % of the wind"
                  + " pressure.",
          level.isPresent()
              ? "Keep one."
              : "Add `level: ultimate` (a map of ultimate speeds) or `level: nominal` (older maps,"
                  + " 50 years).");
      return null;
    }
    if (period.isPresent()) {
      return new SiteWind.Level.ReturnPeriod(period.getAsDouble() / Unit.YR.factor());
    }
    if (level.get().text().equals("nominal")) {
      return new SiteWind.Level.ReturnPeriod(50);
    }
    if (!level.get().text().equals("ultimate")) {
      level.get().error("choice", "level is ultimate or nominal.", "");
      return null;
    }
    Map<String, Double> years = Map.of("I", 300.0, "II", 700.0, "III", 1700.0, "IV", 3000.0);
    String category = r.text("risk-category", "");
    if (!years.containsKey(category)) {
      r.error(
          "choice",
          "An ultimate speed needs its risk category I, II, III or IV.",
          "Add `risk-category: II`.");
      return null;
    }
    return new SiteWind.Level.Ultimate(category, years.get(category));
  }

  private SiteWind.Topography topography(Key k) {
    if (k.isScalar()) {
      if (!k.text().equals("flat")) {
        k.error("choice", "\"" + k.text() + "\" is not known here.", "Write flat, or a factor.");
      }
      return new SiteWind.Topography.Flat();
    }
    if (k.isList()) {
      List<SiteWind.Topography.Sector> sectors = new ArrayList<>();
      for (Key s : k.items()) {
        sectors.add(
            new SiteWind.Topography.Sector(
                s.get("from").map(Key::bearing).orElse(0.0),
                s.get("to").map(Key::bearing).orElse(0.0),
                s.positive("speed-factor", Dimension.ONE),
                s.positive("pressure-factor", Dimension.ONE)));
        s.close();
      }
      return new SiteWind.Topography.BySector(sectors);
    }
    OptionalDouble speed = k.positive("speed-factor", Dimension.ONE);
    OptionalDouble pressure = k.positive("pressure-factor", Dimension.ONE);
    k.known("hill");
    k.close();
    if (speed.isPresent()) {
      return new SiteWind.Topography.SpeedFactor(speed.getAsDouble());
    }
    if (pressure.isPresent()) {
      return new SiteWind.Topography.PressureFactor(pressure.getAsDouble());
    }
    faults.open(
        "hill-not-calculated",
        "site.wind.topographic",
        "A hill is described; its speed-up is not calculated by this version, and nothing is added.",
        "Give speed-factor or pressure-factor from the code of the place.");
    return new SiteWind.Topography.NotStated();
  }
}
