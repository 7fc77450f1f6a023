package org.mastwright.report;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.Basis;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.design.Joint;
import org.mastwright.design.Project;
import org.mastwright.design.Rotor;
import org.mastwright.design.Section;
import org.mastwright.design.Site;
import org.mastwright.design.SiteWind;
import org.mastwright.design.Surroundings;
import org.mastwright.design.Tower;
import org.mastwright.design.Tube;
import org.mastwright.design.Turbine;
import org.mastwright.forces.Vector3;
import org.mastwright.units.Unit;
import org.mastwright.units.UnitSystem;

/** Two invented towers. */
final class SampleDesigns {
  private static final OptionalDouble NONE = OptionalDouble.empty();
  private static final Tube.Steel STEEL =
      new Tube.Steel("S235", 235e6, 360e6, 210e9, 81e9, 7850, false, "EN 10025-2 [recalled]");

  private SampleDesigns() {}

  static Project project(String title, Project.Sheet sheet, UnitSystem units) {
    return new Project(
        title,
        "J-117",
        "Bench household",
        "North field, gravel bench",
        "14-208",
        "",
        Optional.of(LocalDate.of(2031, 5, 4)),
        "B",
        "Installer, second truck",
        "",
        sheet,
        units,
        0.19);
  }

  static Design guyed(Project project) {
    Tower tower =
        new Tower(
            Tower.Kind.GUYED_MAST,
            new Tower.BaseSupport.Hinged(0),
            0.2286,
            List.of(
                tube(0, 6.4, 0.1143, 0.0052),
                tube(6.4, 17.07, 0.1143, 0.0052),
                tube(17.07, 18.29, 0.073, 0.007)),
            joints(),
            0.002,
            0.002,
            List.of(new Tower.Attachment("cable inside", 0.23, 18.5, 27, 0)),
            List.of(guys(1, 6.1), guys(2, 11.6), guys(3, 16.15)),
            List.of());
    return new Design(
        project,
        List.of(
            new Design.Paper(
                "wind and ice sheet", "county building office", "2030-11-02", "site.wind"),
            new Design.Paper("machine data sheet", "maker", "", "turbine")),
        new Surroundings(
            List.of(new Surroundings.LotLine(Math.PI, 29.3)),
            OptionalDouble.of(42.7),
            Optional.empty(),
            Optional.of(new Surroundings.Setback("base", 1.1)),
            NONE),
        Optional.of(basis()),
        Optional.of(site()),
        Optional.of(turbine()),
        tower,
        new Ground(anchors(), Optional.of(pad())),
        Optional.empty(),
        List.of(),
        Optional.empty());
  }

  static Design pole(Project project) {
    Tower tower =
        new Tower(
            Tower.Kind.MONOPOLE,
            new Tower.BaseSupport.Fixed(),
            0.3,
            List.of(tube(0, 6, 0.219, 0.008), tube(6, 12, 0.168, 0.0063)),
            List.of(
                new Joint(
                    0, Joint.Kind.BASE_PLATE, NONE, NONE, Map.of("plate", 0.03), Map.of(), 8)),
            0.0025,
            0.003,
            List.of(),
            List.of(),
            List.of());
    return new Design(
        project,
        List.of(),
        Surroundings.none(),
        Optional.of(basis()),
        Optional.of(site()),
        Optional.of(turbine()),
        tower,
        new Ground(List.of(), Optional.empty()),
        Optional.empty(),
        List.of(),
        Optional.empty());
  }

  private static Tube tube(double from, double to, double outside_m, double wall_m) {
    Section section = new Section(outside_m, wall_m, 0);
    return new Tube(
        "pipe " + Math.round(outside_m * 1000),
        from,
        to,
        section,
        section,
        STEEL,
        Tube.Making.WELDED_PIPE,
        16,
        "pipe table");
  }

  private static List<Joint> joints() {
    return List.of(
        new Joint(
            0,
            Joint.Kind.BASE_PLATE,
            NONE,
            NONE,
            Map.of("plate", 0.0127, "size", 0.356),
            Map.of("grade", "A307", "shape", "square"),
            4),
        new Joint(6.4, Joint.Kind.COUPLING, NONE, NONE, Map.of(), Map.of("thread", "tapered"), 0),
        new Joint(17.07, Joint.Kind.SLEEVE, NONE, NONE, Map.of("overlap", 0.61), Map.of(), 2));
  }

  private static GuySet guys(int number, double along_m) {
    GuySet.Rope rope =
        new GuySet.Rope(
            "1x7 strand 1/4 in EHS",
            0.00635,
            24.5e-6,
            165e9,
            0.15,
            0.18,
            29_600,
            "ASTM A475 table [read]");
    List<GuySet.Guy> guys = new ArrayList<>();
    for (int i = 0; i < 4; i++) {
      guys.add(new GuySet.Guy(i * Math.PI / 2, i));
    }
    return new GuySet(
        number,
        along_m,
        0,
        rope,
        new GuySet.EndFitting("clips", 3, 0.8, true),
        List.of(),
        number == 3 ? new GuySet.Tension.Sag(0.1) : new GuySet.Tension.Snug(),
        true,
        0.1,
        0,
        true,
        12e-6,
        guys);
  }

  static List<Ground.Anchor> anchors() {
    List<Ground.Anchor> anchors = new ArrayList<>();
    List<String> names = List.of("north", "east", "south", "west");
    List<Ground.Kind> kinds =
        List.of(
            new Ground.Kind.Screw(0.152, 1, 0.019, OptionalDouble.of(1.2), NONE, true, NONE, NONE),
            new Ground.Kind.Block(0.9, 0.6, 0.6, 0.3, 2320),
            new Ground.Kind.NotDescribed(),
            new Ground.Kind.Tested(17_800, 600, false));
    for (int i = 0; i < 4; i++) {
      Vector3 at = Vector3.towards(i * Math.PI / 2, 10.97);
      anchors.add(
          new Ground.Anchor(
              names.get(i), i * Math.PI / 2, at.east(), at.north(), i * -0.15, kinds.get(i)));
    }
    return anchors;
  }

  private static Ground.Foundation pad() {
    return new Ground.Foundation(
        new Ground.Shape.Pad(0.91, 0.91, 0.99, 0.76, 0.23),
        OptionalDouble.of(20.7e6),
        2320,
        Optional.empty());
  }

  private static Basis basis() {
    return new Basis(
        Basis.LoadBasis.IEC_61400_2,
        Basis.StrengthBasis.EN_1993,
        List.of(),
        2,
        20 * 365.25 * 86400,
        false,
        Map.of("gamma-m1", 1.0));
  }

  private static Site site() {
    return new Site(
        OptionalDouble.of(580),
        NONE,
        new SiteWind(
            new SiteWind.Stated.Speed(
                51.4,
                SiteWind.Averaging.GUST_3_S,
                new SiteWind.Level.Ultimate("II", 700),
                10.06,
                "open",
                "county sheet"),
            Optional.of(new SiteWind.AnnualMean(5.1, 30)),
            "II",
            new SiteWind.Topography.Flat()),
        new Site.Ice.NotStated(),
        new Site.Temperature(286, 247, 314),
        Optional.empty(),
        Optional.empty());
  }

  private static Turbine turbine() {
    Rotor rotor =
        new Rotor(
            Rotor.Kind.PROPELLER,
            3,
            3.66,
            0.204,
            21,
            new Rotor.MassBand(17, 25),
            Rotor.Position.UPWIND,
            0.381,
            0.05,
            0,
            0.1,
            7,
            0,
            true,
            new Rotor.Blade(5, 0.7, 3, false),
            new Rotor.Shaft(0.2, 0.381),
            false,
            List.of(),
            Optional.empty());
    return new Turbine(
        "maker's data sheet",
        "",
        OptionalDouble.of(53.6),
        86,
        rotor,
        new Turbine.Head(52, 0.457, 0.4, 0.05, 0.46, 8, 12),
        Optional.of(new Turbine.Tail(0.56, 2.13, 12.7)),
        new Turbine.Rated(1800, true, 10.7, 40.8),
        new Turbine.RotorSpeed(
            Unit.RPM.toSi(130),
            Unit.RPM.toSi(420),
            NONE,
            OptionalDouble.of(Unit.RPM.toSi(780)),
            List.of()),
        OptionalDouble.of(3.1),
        NONE,
        new Turbine.DesignPoint(1600, 40),
        new Turbine.Yaw("tail", NONE),
        NONE,
        2,
        Turbine.Control.FURLING,
        Optional.of(new Turbine.Furl(11.6, 15.2, "tail")),
        Turbine.Parked.BOTH,
        0.0063,
        Optional.empty(),
        List.of(),
        0.1);
  }
}
