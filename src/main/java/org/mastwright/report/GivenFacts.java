package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import org.mastwright.design.Basis;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.Project;
import org.mastwright.design.Rotor;
import org.mastwright.design.Site;
import org.mastwright.design.Surroundings;
import org.mastwright.design.Tower;
import org.mastwright.design.Turbine;
import org.mastwright.units.Unit;

/** The tower file in words: what was given, or {@code not given}. */
final class GivenFacts {
  private final Print print;
  private final List<Fact> facts = new ArrayList<>();
  private final List<Fact.Group> groups = new ArrayList<>();

  private GivenFacts(Print print) {
    this.print = print;
  }

  static List<Fact.Group> of(Design d, Print print) {
    GivenFacts g = new GivenFacts(print);
    g.project(d.project());
    d.basis().ifPresent(g::basis);
    d.site().ifPresent(g::site);
    d.turbine().ifPresent(g::turbine);
    d.turbine().map(Turbine::rotor).ifPresent(g::rotor);
    g.tower(d.tower());
    d.ground().foundation().ifPresent(g::foundation);
    g.surroundings(d.surroundings());
    return List.copyOf(g.groups);
  }

  private void add(String name, String value) {
    facts.add(new Fact(name, value));
  }

  private void close(String heading) {
    groups.add(new Fact.Group(heading, facts));
    facts.clear();
  }

  private void project(Project p) {
    add("Title", Print.words(p.title()));
    add("Reference", Print.words(p.reference()));
    add("Revision", Print.words(p.revision()));
    add("Owner", Print.words(p.owner()));
    add("Address", Print.words(p.address()));
    add("Parcel", Print.words(p.parcel()));
    add("Made for", Print.words(p.client()));
    add("Date", p.date().map(Object::toString).orElse(Print.NOT_GIVEN));
    add("Prepared by", Print.words(p.preparedBy()));
    add("Checked by", Print.words(p.checkedBy()));
    add(
        "Bearings",
        p.declination_rad() == 0
            ? "true"
            : "magnetic, turned by " + print.of(p.declination_rad(), Unit.DEG));
    close("Project");
  }

  private void basis(Basis b) {
    add("Loads", b.loads().title());
    add("Strength", b.strength().title());
    add(
        "Beside it",
        b.also().isEmpty()
            ? "nothing"
            : b.also().stream().map(Basis.LoadBasis::title).collect(Collectors.joining(", ")));
    add("Reliability class", String.valueOf(b.reliabilityClass()));
    add("Service life", print.of(b.serviceLife_s(), Unit.YR));
    add("Loss of a guy counts", Print.yesNo(b.robust()));
    b.nation().entrySet().stream()
        .sorted(java.util.Map.Entry.comparingByKey())
        .forEach(e -> add("National " + e.getKey(), Print.factor(e.getValue())));
    close("Standards");
  }

  private void site(Site s) {
    add("Extreme wind", Basics.extreme(s.wind().stated(), print));
    add(
        "Mean wind",
        s.wind()
            .annualMean()
            .map(m -> print.of(m.speed_mps(), Unit.MPS) + " at " + print.of(m.height_m(), Unit.M))
            .orElse(Print.NOT_GIVEN));
    add("Terrain", Print.words(s.wind().terrain()));
    add("Lie of the land", Basics.topography(s.wind().topography(), print));
    add("Altitude", print.of(s.altitude_m(), Unit.M));
    add("Air density", print.of(s.airDensity_kgpm3(), Unit.KGPM3));
    add("Ice", Basics.ice(s.ice(), print));
    add("Temperature when set", print.of(s.temperature().setting_K(), Unit.DEGC));
    add(
        "Lowest and highest",
        print.of(s.temperature().lowest_K(), Unit.DEGC)
            + " and "
            + print.of(s.temperature().highest_K(), Unit.DEGC));
    s.soil().ifPresentOrElse(this::soil, () -> add("Soil", Print.NOT_GIVEN));
    close("Site");
  }

  private void soil(Site.Soil s) {
    add("Soil known by", Print.words(s.source()));
    add("Soil class", Print.words(s.soilClass()) + (s.wet() ? ", wet" : ""));
    add(
        "Bearing",
        print.of(s.bearing_Pa(), Unit.KPA)
            + (s.bearing_Pa().isPresent() ? ", " + Print.words(s.bearingIs()) : ""));
    add("Lateral bearing", print.of(s.lateralBearing_Papm(), Unit.KPAPM));
    add("Friction angle", print.of(s.frictionAngle_rad(), Unit.DEG));
    add("Undrained strength", print.of(s.undrainedStrength_Pa(), Unit.KPA));
    add("Water below ground", print.of(s.waterLevel_m(), Unit.M));
    add("Frost depth", print.of(s.frostDepth_m(), Unit.M));
  }

  private void turbine(Turbine t) {
    add("Source of the data", Print.words(t.source()));
    add("Certified class", Print.words(t.certifiedClass()));
    add("Survival wind (echoed only)", print.of(t.survivalWind_mps(), Unit.MPS));
    add("Mass above the yaw bearing", print.of(t.mass_kg(), Unit.KG));
    add("Hub above mast top", print.of(t.head().hubAboveTop_m(), Unit.M));
    add("Side area of the head", print.of(t.head().sideArea_m2(), Unit.M2));
    add(
        "Tail",
        t.tail()
            .map(
                v ->
                    print.of(v.area_m2(), Unit.M2)
                        + " at "
                        + print.of(v.arm_m(), Unit.M)
                        + ", "
                        + print.of(v.mass_kg(), Unit.KG))
            .orElse("none"));
    add(
        "Rated",
        print.of(t.rated().power_W(), Unit.KW)
            + (t.rated().electrical() ? " electrical" : " at the shaft")
            + " at "
            + print.of(t.rated().wind_mps(), Unit.MPS)
            + ", "
            + print.of(t.rated().omega_radps(), Unit.RPM));
    add(
        "Rotor speed",
        print.of(t.rotorSpeed().lowest_radps(), Unit.RPM)
            + " to "
            + print.of(t.rotorSpeed().highest_radps(), Unit.RPM));
    add("Runaway speed", print.of(t.rotorSpeed().runaway_radps(), Unit.RPM));
    add("Cut-in wind", print.of(t.cutIn_mps(), Unit.MPS));
    add("Cut-out wind", print.of(t.cutOut_mps(), Unit.MPS));
    add("Speed kept by", t.controlledBy().key());
    add(
        "Furl",
        t.furl()
            .map(
                f ->
                    print.of(f.begins_mps(), Unit.MPS)
                        + " to "
                        + print.of(f.complete_mps(), Unit.MPS)
                        + ", by "
                        + f.how())
            .orElse(Print.NOT_GIVEN));
    add("In a storm", t.parked().name().toLowerCase(Locale.ROOT));
    add("Margin of frequencies", print.of(t.marginRatio(), Unit.PERCENT));
    close("Machine");
  }

  private void rotor(Rotor r) {
    add("Kind", r.kind().key() + ", " + r.blades() + " blades");
    add("Diameter", print.of(r.diameter_m(), Unit.M));
    add("Area of one blade", print.of(r.areaPerBlade_m2(), Unit.M2));
    add("Mass", print.of(r.mass_kg(), Unit.KG));
    add(
        "Position",
        r.position().name().toLowerCase(Locale.ROOT)
            + ", overhang "
            + print.of(r.overhang_m(), Unit.M));
    add(
        "Tilt and cone",
        print.of(r.tilt_rad(), Unit.DEG) + " and " + print.of(r.cone_rad(), Unit.DEG));
    add("Tip speed ratio", Print.factor(r.tipSpeedRatio()));
    add("Balance record", r.balanceRecord() ? "given" : Print.NOT_GIVEN);
    r.upright()
        .ifPresent(
            u -> {
              add("Height of the blades", print.of(u.height_m(), Unit.M));
              add("Blades begin above top", print.of(u.bottomAboveTop_m(), Unit.M));
              add("Top of the shaft", Print.words(u.topHeld()));
            });
    close("Rotor");
  }

  private void tower(Tower t) {
    add("Kind", t.kind().key());
    add("Foot", base(t.base()));
    add("Foot above ground", print.of(t.footLevel_m(), Unit.M));
    add("Length of mast", print.of(t.length_m(), Unit.M));
    add("Out of plumb as built", Print.factor(t.outOfPlumbRatio()));
    add("Structural damping", print.of(t.dampingRatio(), Unit.PERCENT));
    t.attachments()
        .forEach(
            x ->
                add(
                    "Fixed to it",
                    x.what()
                        + ", "
                        + print.of(x.bottom_m(), Unit.M)
                        + " to "
                        + print.of(x.top_m(), Unit.M)
                        + ", "
                        + print.of(x.mass_kg(), Unit.KG)
                        + ", drag area "
                        + print.of(x.dragArea_m2(), Unit.M2)));
    close("Tower");
  }

  private String base(Tower.BaseSupport base) {
    if (base instanceof Tower.BaseSupport.Hinged h) {
      return "hinged about a pin on bearing " + Print.bearing(h.axisBearing_rad());
    }
    if (base instanceof Tower.BaseSupport.Sprung s) {
      return "sprung, " + print.of(s.stiffness_Nmprad(), Unit.KNMPRAD);
    }
    return base instanceof Tower.BaseSupport.Fixed ? "fixed" : "pinned";
  }

  private void foundation(Ground.Foundation f) {
    add("Shape", shape(f.shape()));
    add("Concrete strength", print.of(f.concreteStrength_Pa(), Unit.MPA));
    add("Concrete density", print.of(f.concreteDensity_kgpm3(), Unit.KGPM3));
    add(
        "Bars",
        f.bars()
            .map(
                b ->
                    b.count()
                        + " of "
                        + print.of(b.size_m(), Unit.MM)
                        + ", cover "
                        + print.of(b.cover_m(), Unit.MM))
            .orElse(Print.NOT_GIVEN));
    close("Footing");
  }

  private String shape(Ground.Shape shape) {
    if (shape instanceof Ground.Shape.Pad p) {
      return "pad "
          + print.of(p.length_m(), Unit.M)
          + " by "
          + print.of(p.width_m(), Unit.M)
          + ", "
          + print.of(p.thickness_m(), Unit.M)
          + " thick, underside "
          + print.of(p.underside_m(), Unit.M)
          + " below ground";
    }
    if (shape instanceof Ground.Shape.Pier p) {
      return "pier "
          + print.of(p.diameter_m(), Unit.M)
          + " across, "
          + print.of(p.belowGround_m(), Unit.M)
          + " deep";
    }
    if (shape instanceof Ground.Shape.Embedded e) {
      return "pole set "
          + print.of(e.depth_m(), Unit.M)
          + " deep, "
          + print.of(e.diameter_m(), Unit.M)
          + " across";
    }
    return "on rock";
  }

  private void surroundings(Surroundings s) {
    s.lotLines()
        .forEach(
            l ->
                add(
                    "Lot line",
                    print.of(l.distance_m(), Unit.M) + " on " + Print.bearing(l.bearing_rad())));
    if (s.lotLines().isEmpty()) {
      add("Lot lines", Print.NOT_GIVEN);
    }
    add("Overhead line", print.of(s.overheadLine_m(), Unit.M));
    add(
        "Runway",
        s.runway()
            .map(r -> print.of(r.distance_m(), Unit.M) + " away, " + print.of(r.length_m(), Unit.M))
            .orElse(Print.NOT_GIVEN));
    add(
        "Setback rule",
        s.setback()
            .map(r -> Print.factor(r.multiplierFactor()) + " times total height from " + r.of())
            .orElse(Print.NOT_GIVEN));
    add("Least blade height by rule", print.of(s.lowestBladeRule_m(), Unit.M));
    close("Around it");
  }
}
