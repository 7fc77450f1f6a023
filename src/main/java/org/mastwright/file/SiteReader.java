package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.Site;
import org.mastwright.design.SiteWind;
import org.mastwright.units.Dimension;
import org.mastwright.units.Unit;
import org.mastwright.working.DefaultTaken.Side;

/** Wind, ice, temperature, ground and earthquake of the site. */
final class SiteReader {
  private final Key site;
  private final double declination_rad;
  private final Faults faults;

  SiteReader(Key site, double declination_rad) {
    this.site = site;
    this.declination_rad = declination_rad;
    this.faults = site.faults();
  }

  Site read() {
    Optional<Key> wind = site.need("wind", "missing", "The wind is not given and never guessed.");
    SiteWind w = wind.map(this::wind).orElse(null);
    Site.Ice ice = site.get("ice").map(this::ice).orElseGet(this::noIceStated);
    Site.Temperature t = temperature();
    Optional<Site.Soil> soil = site.get("soil").map(SoilReader::soil);
    Optional<Site.Seismic> seismic = site.get("seismic").map(SoilReader::seismic);
    Site all =
        new Site(
            site.value("altitude", Dimension.LENGTH),
            site.positive("air-density", Dimension.DENSITY),
            w,
            ice,
            t,
            soil,
            seismic);
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
    Optional<Site.Ice.WithWind> wind = k.get("with-wind").flatMap(SiteReader::withWind);
    double oneSided = k.value("one-sided", Dimension.ONE).orElse(0);
    String kind = k.choice("kind", "glaze");
    Site.Ice ice;
    if (k.has("class")) {
      if (k.has("thickness")) {
        k.error("choice", "Both a class and a thickness are given.", "Keep one of the two.");
      }
      ice = new Site.Ice.IsoClass(k.choice("class"), wind, oneSided);
    } else {
      double t = k.required("thickness", Dimension.LENGTH, "How thick is the ice?");
      ice =
          new Site.Ice.Thickness(
              kind.equals("rime") ? Site.Ice.Kind.RIME : Site.Ice.Kind.GLAZE, t, wind, oneSided);
    }
    k.close();
    return ice;
  }

  private static Optional<Site.Ice.WithWind> withWind(Key w) {
    OptionalDouble speed = w.positive("speed", Dimension.SPEED);
    OptionalDouble pressure = w.positive("pressure-factor", Dimension.ONE);
    OptionalDouble factor = w.positive("speed-factor", Dimension.ONE);
    int given =
        (speed.isPresent() ? 1 : 0) + (pressure.isPresent() ? 1 : 0) + (factor.isPresent() ? 1 : 0);
    if (given != 1) {
      w.error("choice", "Give `speed`, `pressure-factor` or `speed-factor`, one of them.", "");
    }
    Optional<SiteWind.Averaging> averaging = Optional.empty();
    if (speed.isPresent()) {
      w.need("averaging", "missing", "Over what time is the speed averaged?");
      averaging = averaging(w);
    }
    w.close();
    if (pressure.isPresent()) {
      return Optional.of(new Site.Ice.WithWind.PressureFactor(pressure.getAsDouble()));
    }
    if (factor.isPresent()) {
      return Optional.of(new Site.Ice.WithWind.SpeedFactor(factor.getAsDouble()));
    }
    return averaging.map(a -> new Site.Ice.WithWind.Speed(speed.orElse(Double.NaN), a));
  }

  private static Optional<SiteWind.Averaging> averaging(Key k) {
    String word = k.choice("averaging");
    for (SiteWind.Averaging x : SiteWind.Averaging.values()) {
      if (x.key().equals(word)) {
        return Optional.of(x);
      }
    }
    return Optional.empty();
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
          bothGiven(named.get(), reference.get()),
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
    String terrain = w.choice("terrain");
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

  private static final Map<String, Double> CLASS_MPS =
      Map.of("I", 50.0, "II", 42.5, "III", 37.5, "IV", 30.0);

  private static String bothGiven(Key named, Key reference) {
    Double own = CLASS_MPS.get(named.text());
    String speed = reference.isMap() ? reference.text("speed", "") : "";
    return "Both `class: "
        + named.text()
        + "`"
        + (own == null ? "" : " (Vref " + Unit.MPS.print(own) + ")")
        + " and a reference speed"
        + (speed.isEmpty() ? "" : " (" + speed + ")")
        + " are given.";
  }

  private static SiteWind.Stated iecClass(Key k) {
    Map<String, Double> speeds = CLASS_MPS;
    if (!speeds.containsKey(k.text())) {
      k.error("choice", "The classes are I, II, III and IV.", "");
      return null;
    }
    return new SiteWind.Stated.IecClass(k.text(), speeds.get(k.text()));
  }

  private SiteWind.Stated reference(Key r) {
    double speed = r.required("speed", Dimension.SPEED, "The wind speed is never guessed.");
    r.need("averaging", "missing", "Over what time is the speed averaged? It is never guessed.");
    Optional<SiteWind.Averaging> averaging = averaging(r);
    SiteWind.Level level = level(r);
    if (!r.has("height")) {
      faults.taken("site.wind.reference.height", "10 m", "basis", Side.NEUTRAL);
    }
    double height = r.positive("height", Dimension.LENGTH).orElse(10);
    String terrain = r.text("terrain", "open");
    String source = r.text("source", "");
    SiteWind.Stated stated =
        averaging.isEmpty() || level == null
            ? null
            : new SiteWind.Stated.Speed(speed, averaging.get(), level, height, terrain, source);
    r.close();
    return stated;
  }

  private static SiteWind.Level level(Key r) {
    Optional<Key> level = r.get("level");
    OptionalDouble period = r.positive("return-period", Dimension.TIME);
    String category = r.choice("risk-category");
    if (level.isPresent() == period.isPresent()) {
      r.error(
          "E2",
          level.isPresent()
              ? "Both a level and a return period are given."
              : "This speed could be ultimate or nominal; the difference is 40 % of the wind"
                  + " pressure.",
          level.isPresent()
              ? "Keep one."
              : "Add `level: ultimate` (the map of asce-7-16) or `level: nominal` (older maps,"
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
                sectorEnd(s, "from"),
                sectorEnd(s, "to"),
                s.positive("speed-factor", Dimension.ONE),
                s.positive("pressure-factor", Dimension.ONE)));
        if (s.has("speed-factor") == s.has("pressure-factor")) {
          s.error("choice", "Give `speed-factor` or `pressure-factor`, one of them.", "");
        }
        s.close();
      }
      return new SiteWind.Topography.BySector(sectors);
    }
    OptionalDouble speed = k.positive("speed-factor", Dimension.ONE);
    OptionalDouble pressure = k.positive("pressure-factor", Dimension.ONE);
    Optional<SiteWind.Topography> hill = k.get("hill").map(this::hill);
    if ((speed.isPresent() ? 1 : 0) + (pressure.isPresent() ? 1 : 0) + (hill.isPresent() ? 1 : 0)
        != 1) {
      k.error("choice", "Give `speed-factor`, `pressure-factor` or `hill`, one of them.", "");
    }
    k.close();
    if (speed.isPresent()) {
      return new SiteWind.Topography.SpeedFactor(speed.getAsDouble());
    }
    if (pressure.isPresent()) {
      return new SiteWind.Topography.PressureFactor(pressure.getAsDouble());
    }
    return hill.orElseGet(SiteWind.Topography.NotStated::new);
  }

  private double sectorEnd(Key s, String key) {
    return s.need(key, "missing", "A sector goes `from` one bearing clockwise `to` another.")
        .map(b -> b.bearing() + declination_rad)
        .orElse(0.0);
  }

  private SiteWind.Topography hill(Key h) {
    SiteWind.Topography hill =
        new SiteWind.Topography.Hill(
            h.choice("kind"),
            h.required("height", Dimension.LENGTH, "How high is the hill?"),
            h.required("half-length", Dimension.LENGTH, "How long is its slope?"),
            h.value("upwind-distance", Dimension.LENGTH).orElse(0));
    h.close();
    faults.open(
        "hill-not-calculated",
        "site.wind.topographic.hill",
        "A hill is described; its speed-up is not calculated by this version, and nothing is"
            + " added.",
        "Give speed-factor or pressure-factor from the code of the place.");
    return hill;
  }
}
