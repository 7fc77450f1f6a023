package org.mastwright.wind;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.design.Site;
import org.mastwright.design.SiteWind;
import org.mastwright.design.SiteWind.Topography;
import org.mastwright.units.Unit;
import org.mastwright.working.Clause;
import org.mastwright.working.Status;
import org.mastwright.working.Step;

/**
 * The speeds an IEC 61400-2 check is made for, at hub height, with the steps that led there.
 *
 * @param gust50_mps 50-year 3 s gust without topography
 */
public record DesignWind(
    double density_kgpm3,
    double hub_m,
    double reference_mps,
    double gust50_mps,
    double gust1_mps,
    double mean_mps,
    Topography topography,
    List<Step> steps) {
  private static final Clause GIVEN = new Clause("tower file", "-", "site.wind", Status.PRACTICE);
  private static final double GUST_EXPONENT = 0.11;
  private static final double MEAN_EXPONENT = 0.2;

  public DesignWind {
    steps = List.copyOf(steps);
  }

  /** Works out the speeds for a site and a hub height. */
  public static DesignWind of(Site site, double hub_m) {
    List<Step> steps = new ArrayList<>();
    double density = density(site, steps);
    double reference = reference(site.wind(), hub_m, steps);
    Step gust = IecWind.GUST_AT.at(reference, hub_m, hub_m);
    steps.add(gust);
    Step year = IecWind.ONE_YEAR_GUST.at(gust.si());
    steps.add(year);
    double atSite =
        site.wind()
            .annualMean()
            .map(m -> IecWind.toHeight_mps(m.speed_mps(), hub_m, m.height_m(), MEAN_EXPONENT))
            .orElse(0.0);
    Step mean = IecWind.MEAN.at(reference, atSite);
    steps.add(mean);
    return new DesignWind(
        density,
        hub_m,
        reference,
        gust.si(),
        year.si(),
        mean.si(),
        site.wind().topography(),
        steps);
  }

  private static double density(Site site, List<Step> steps) {
    if (site.airDensity_kgpm3().isPresent()) {
      double stated = site.airDensity_kgpm3().getAsDouble();
      steps.add(Step.given("ρ", "as stated", stated, Unit.KGPM3, GIVEN));
      return stated;
    }
    Step step = IecWind.DENSITY.at(site.altitude_m().orElse(0));
    steps.add(step);
    return step.si();
  }

  private static double reference(SiteWind wind, double hub_m, List<Step> steps) {
    if (wind.stated() instanceof SiteWind.Stated.IecClass c) {
      steps.add(
          Step.given(
              "V_ref",
              "class " + c.name(),
              c.referenceSpeed_mps(),
              Unit.MPS,
              new Clause("IEC 61400-2", "2013", "Table 1", Status.RECALLED)));
      return c.referenceSpeed_mps();
    }
    SiteWind.Stated.Speed s = (SiteWind.Stated.Speed) wind.stated();
    steps.add(
        Step.given(
            "V_T",
            "as stated: " + s.averaging().key() + ", " + years(s) + " years",
            s.speed_mps(),
            Unit.MPS,
            GIVEN));
    Step fifty = fiftyYear(s, steps);
    double time_s = s.averaging().time_s(s.speed_mps());
    if (s.averaging() == SiteWind.Averaging.TEN_MINUTES) {
      Step hub =
          IecWind.TO_HUB.at(fifty.si(), hub_m, s.height_m(), meanExponent(hub_m, s.height_m()));
      steps.add(hub);
      return hub.si();
    }
    Step short3 = IecWind.DURST.at(3);
    Step stated = IecWind.DURST.at(time_s);
    Step gust = IecWind.AVERAGING.at(fifty.si(), short3.si(), stated.si());
    Step hub = IecWind.TO_HUB.at(gust.si(), hub_m, s.height_m(), GUST_EXPONENT);
    Step reference = IecWind.REFERENCE_FROM_GUST.at(hub.si());
    steps.addAll(List.of(short3, stated, gust, hub, reference));
    return reference.si();
  }

  /**
   * A map of ultimate speeds is undone by the curve it was made with; any other return period by
   * that curve and by EN 1991-1-4, and the greater speed counts.
   */
  private static Step fiftyYear(SiteWind.Stated.Speed s, List<Step> steps) {
    double years = s.level().returnPeriod_yr();
    Step american = IecWind.TO_FIFTY_YEARS.at(s.speed_mps(), years);
    steps.add(american);
    if (s.level() instanceof SiteWind.Level.Ultimate || years <= 1) {
      return american;
    }
    Step european = IecWind.TO_FIFTY_YEARS_EN.at(s.speed_mps(), years);
    steps.add(european);
    return european.si() > american.si() ? european : american;
  }

  /** Of a mean speed: the normal profile upwards, the flatter gust profile downwards. */
  private static double meanExponent(double hub_m, double stated_m) {
    return hub_m > stated_m ? MEAN_EXPONENT : GUST_EXPONENT;
  }

  private static String years(SiteWind.Stated.Speed s) {
    return Long.toString(Math.round(s.level().returnPeriod_yr()));
  }

  /** Factor on speed by the lie of the land for wind from a bearing. */
  public double speedFactor(double windFrom_rad) {
    if (topography instanceof Topography.SpeedFactor f) {
      return f.speedFactor();
    }
    if (topography instanceof Topography.PressureFactor f) {
      return Math.sqrt(f.pressureFactor());
    }
    if (topography instanceof Topography.BySector by) {
      for (Topography.Sector s : by.sectors()) {
        double width = (s.to_rad() - s.from_rad() + 4 * Math.PI) % (2 * Math.PI);
        double in = (windFrom_rad - s.from_rad() + 4 * Math.PI) % (2 * Math.PI);
        if (in <= width) {
          return s.speedFactor().orElse(Math.sqrt(s.pressureFactor().orElse(1)));
        }
      }
    }
    return 1;
  }
}
