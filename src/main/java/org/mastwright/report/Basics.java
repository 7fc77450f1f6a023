package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.mastwright.design.Basis;
import org.mastwright.design.Design;
import org.mastwright.design.Site;
import org.mastwright.design.SiteWind;
import org.mastwright.units.Unit;

/** Wind, ice and standards in a line each, as the first page and the chapter on wind say them. */
final class Basics {
  private Basics() {}

  static List<Fact> madeFor(Design d, Print print) {
    List<Fact> facts = new ArrayList<>();
    d.basis().ifPresent(b -> facts.add(new Fact("Standards", standards(b))));
    d.site()
        .ifPresent(
            s -> {
              facts.add(new Fact("Wind", wind(s.wind(), print)));
              facts.add(new Fact("Ground", terrain(s.wind(), print)));
              facts.add(new Fact("Ice", ice(s.ice(), print)));
            });
    if (facts.isEmpty()) {
      facts.add(new Fact("Loads", "direct loads of a verification file, no site and no standard"));
    }
    return facts;
  }

  static String standards(Basis b) {
    String also =
        b.also().isEmpty()
            ? ""
            : "; beside it, not mixed: "
                + b.also().stream().map(Basis.LoadBasis::title).collect(Collectors.joining(", "));
    return "loads " + b.loads().title() + ", strength " + b.strength().title() + also;
  }

  static String wind(SiteWind wind, Print print) {
    String mean =
        wind.annualMean()
            .map(
                m ->
                    "; mean "
                        + print.of(m.speed_mps(), Unit.MPS)
                        + " at "
                        + print.of(m.height_m(), Unit.M))
            .orElse("; mean speed not given");
    return extreme(wind.stated(), print) + mean;
  }

  static String extreme(SiteWind.Stated stated, Print print) {
    if (stated instanceof SiteWind.Stated.IecClass c) {
      return "IEC class "
          + c.name()
          + ", reference "
          + print.of(c.referenceSpeed_mps(), Unit.MPS)
          + " (10 min, 50 years, at the hub)";
    }
    SiteWind.Stated.Speed s = (SiteWind.Stated.Speed) stated;
    String source = s.source().isBlank() ? "; source not given" : "; source: " + s.source();
    return print.of(s.speed_mps(), Unit.MPS)
        + ", "
        + s.averaging().key()
        + " at "
        + print.of(s.height_m(), Unit.M)
        + ", "
        + level(s.level())
        + Print.shorten(source, 60);
  }

  static String level(SiteWind.Level level) {
    String years = Print.factor(level.returnPeriod_yr()) + " years";
    return level instanceof SiteWind.Level.Ultimate u
        ? "ultimate, risk category " + u.riskCategory() + " (" + years + ")"
        : "once in " + years;
  }

  static String terrain(SiteWind wind, Print print) {
    return "terrain " + Print.words(wind.terrain()) + ", " + topography(wind.topography(), print);
  }

  static String topography(SiteWind.Topography t, Print print) {
    if (t instanceof SiteWind.Topography.Flat) {
      return "flat (stated)";
    }
    if (t instanceof SiteWind.Topography.NotStated) {
      return "lie of the land NOT GIVEN, worked out flat";
    }
    if (t instanceof SiteWind.Topography.SpeedFactor f) {
      return "factor " + Print.factor(f.speedFactor()) + " on speed for the lie of the land";
    }
    if (t instanceof SiteWind.Topography.PressureFactor f) {
      return "factor " + Print.factor(f.pressureFactor()) + " on pressure for the lie of the land";
    }
    if (t instanceof SiteWind.Topography.Hill h) {
      return h.kind() + ", " + print.of(h.height_m(), Unit.M) + " high";
    }
    SiteWind.Topography.BySector sectors = (SiteWind.Topography.BySector) t;
    return "lie of the land by sector: " + sectors.sectors().size() + " sectors";
  }

  static String ice(Site.Ice ice, Print print) {
    if (ice instanceof Site.Ice.None) {
      return "none (stated)";
    }
    if (ice instanceof Site.Ice.NotStated) {
      return "NOT GIVEN, worked out without ice";
    }
    if (ice instanceof Site.Ice.Thickness t) {
      return print.of(t.thickness_m(), Unit.MM)
          + " "
          + t.kind().name().toLowerCase(java.util.Locale.ROOT)
          + t.withWind().map(w -> ", with " + withWind(w, print)).orElse("");
    }
    Site.Ice.IsoClass c = (Site.Ice.IsoClass) ice;
    return "ISO 12494 class "
        + c.icingClass()
        + c.withWind().map(w -> ", with " + withWind(w, print)).orElse("");
  }

  private static String withWind(Site.Ice.WithWind wind, Print print) {
    if (wind instanceof Site.Ice.WithWind.Speed s) {
      return "wind " + print.of(s.speed_mps(), Unit.MPS) + " (" + s.averaging().key() + ")";
    }
    if (wind instanceof Site.Ice.WithWind.PressureFactor f) {
      return Print.factor(f.pressureFactor()) + " of the wind pressure";
    }
    Site.Ice.WithWind.SpeedFactor f = (Site.Ice.WithWind.SpeedFactor) wind;
    return Print.factor(f.speedFactor()) + " of the wind speed";
  }
}
