package org.mastwright.file;

import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.Basis;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.Project;
import org.mastwright.design.Raising;
import org.mastwright.design.Site;
import org.mastwright.design.Surroundings;
import org.mastwright.design.Tower;
import org.mastwright.design.Turbine;
import org.mastwright.design.Verification;
import org.mastwright.units.Dimension;
import org.mastwright.units.UnitSystem;

/** The whole file, part by part. */
final class DesignReader {
  private final Key top;
  private final Faults faults;
  private double declination_rad;

  DesignReader(Key top) {
    this.top = top;
    this.faults = top.faults();
  }

  Design read() {
    top.need("tower-file", "missing", "The file does not say which format it has.")
        .ifPresent(
            k -> {
              if (!k.text().equals("1")) {
                k.error("format", "Format " + k.text() + " is not known.", "Write tower-file: 1");
              }
            });
    boolean verification = top.has("verification");
    Project project = project();
    List<Design.Paper> papers = papers();
    Surroundings surroundings =
        top.get("surroundings").map(this::surroundings).orElse(Surroundings.none());
    Optional<Basis> basis = top.get("basis").map(this::basis);
    if (basis.isEmpty() && !verification) {
      top.need("basis", "missing", "By which standards should it be judged?");
    }
    Optional<Site> site = top.get("site").map(k -> new SiteReader(k, declination_rad).read());
    if (site.isEmpty() && !verification) {
      top.need("site", "missing", "Where it stands is not given.");
    }
    Optional<Key> towerKey = top.need("tower", "missing", "There is no tower in the file.");
    GroundReader earth = new GroundReader(faults, declination_rad);
    Optional<Ground.Foundation> footing = earth.read(top.get("ground"));
    if (towerKey.isEmpty()) {
      return null;
    }
    Tower tower =
        new TowerReader(faults, declination_rad, earth).read(towerKey.get(), verification);
    Ground ground = new Ground(earth.anchors(), footing);
    askForAnchors(ground, verification);
    Optional<Turbine> turbine =
        verification ? Optional.empty() : top.get("turbine").map(k -> new TurbineReader(k).read());
    if (turbine.isEmpty() && !verification) {
      top.need("turbine", "missing", "There is no turbine in the file.");
    }
    Optional<Raising> raising = top.get("raising").flatMap(k -> raising(k, tower, ground));
    List<Design.CountedSwings> measured = measured();
    Optional<Verification> check =
        top.get("verification").map(k -> new VerificationReader(k).read());
    top.close();
    if (faults.hasErrors()) {
      return null;
    }
    Design design =
        new Design(
            project,
            papers,
            surroundings,
            basis,
            site,
            turbine,
            tower,
            ground,
            raising,
            measured,
            check);
    if (!verification) {
      Plausibility.check(top, design);
    }
    return design;
  }

  private void askForAnchors(Ground ground, boolean verification) {
    boolean some =
        ground.anchors().stream().anyMatch(a -> a.kind() instanceof Ground.Kind.NotDescribed);
    if (some && !verification && !faults.hasErrors()) {
      faults.open(
          "anchors-not-described",
          "ground.anchors",
          "Guys in short form end at anchors that are not described: what these hold is not"
              + " checked.",
          "Describe them in ground.anchors, by name or with `for:`.");
    }
  }

  private Optional<Raising> raising(Key k, Tower tower, Ground ground) {
    faults.open(
        "raising-not-checked",
        "raising",
        "Raising is described and not checked: read, not yet used.",
        "Have the lift planned by someone who does it for a living.");
    MastPlaces places = new MastPlaces(tower.footLevel_m(), tower.tubes());
    return new RaisingReader(k, places, declination_rad)
        .read(tower.guys().size(), ground.anchors().stream().map(Ground.Anchor::name).toList());
  }

  private List<Design.CountedSwings> measured() {
    List<Design.CountedSwings> all = new ArrayList<>();
    top.get("measured")
        .ifPresent(
            list -> {
              for (Key m : list.items()) {
                m.need("swings", "missing", "How many swings were counted?");
                all.add(
                    new Design.CountedSwings(
                        m.choice("what", "mast"),
                        m.choice("state"),
                        m.text("direction", ""),
                        m.integer("swings", 1)
                            / m.required("time", Dimension.TIME, "In what time?")));
                m.close();
              }
            });
    return all;
  }

  private Project project() {
    Optional<Key> found = top.need("project", "missing", "The project is not named.");
    if (found.isEmpty()) {
      return null;
    }
    Key p = found.get();
    p.need("title", "missing", "The project has no title.");
    UnitSystem units =
        switch (p.text("units", "SI")) {
          case "SI" -> UnitSystem.SI;
          case "US" -> UnitSystem.US;
          case "both" -> UnitSystem.BOTH;
          default -> {
            p.error("choice", "project.units is SI, US or both.", "");
            yield UnitSystem.SI;
          }
        };
    String paper = p.text("paper", units == UnitSystem.US ? "Letter" : "A4");
    if (!paper.equals("A4") && !paper.equals("Letter")) {
      p.error("choice", "project.paper is A4 or Letter.", "");
    }
    p.with("north", this::north);
    Project project =
        new Project(
            p.text("title", ""),
            p.text("reference", ""),
            p.text("owner", ""),
            p.text("address", ""),
            p.text("parcel", ""),
            p.text("client", ""),
            date(p),
            p.text("revision", ""),
            p.text("prepared-by", ""),
            p.text("checked-by", ""),
            paper.equals("Letter") ? Project.Sheet.LETTER : Project.Sheet.A4,
            units,
            declination_rad);
    p.close();
    return project;
  }

  private void north(Key k, Faults f) {
    if (k.isScalar()) {
      if (!k.text().equals("true-north")) {
        k.error("choice", "north is true-north or {bearings: magnetic, declination: …}.", "");
      }
      return;
    }
    boolean magnetic = k.choice("bearings", "magnetic").equals("magnetic");
    if (magnetic) {
      k.need("declination", "missing", "Where does magnetic north lie here?");
    }
    k.get("declination")
        .ifPresent(
            d -> {
              boolean west = d.text().endsWith("west");
              String number = d.text().replace("east", "").replace("west", "").trim();
              try {
                double v = org.mastwright.units.Quantities.read(number, Dimension.ANGLE);
                declination_rad = !magnetic ? 0 : west ? -v : v;
              } catch (org.mastwright.units.Quantities.Unreadable wrong) {
                d.error(wrong.id(), wrong.getMessage(), "Write 11 deg east.");
              }
            });
    k.close();
  }

  private static Optional<LocalDate> date(Key p) {
    Optional<Key> k = p.get("date");
    if (k.isEmpty()) {
      return Optional.empty();
    }
    try {
      return Optional.of(LocalDate.parse(k.get().text()));
    } catch (DateTimeParseException e) {
      k.get().error("date", "\"" + k.get().text() + "\" is not a date.", "Write 2031-05-04.");
      return Optional.empty();
    }
  }

  private List<Design.Paper> papers() {
    List<Design.Paper> all = new ArrayList<>();
    top.get("documents")
        .ifPresent(
            list -> {
              for (Key d : list.items()) {
                all.add(
                    new Design.Paper(
                        d.text("what", ""),
                        d.text("by", ""),
                        d.text("date", ""),
                        d.text("used-for", "")));
                d.close();
              }
            });
    return all;
  }

  private Surroundings surroundings(Key s) {
    List<Surroundings.LotLine> lines = new ArrayList<>();
    s.get("lot-lines")
        .ifPresent(
            list -> {
              for (Key l : list.items()) {
                double b = l.get("bearing").map(Key::bearing).orElse(0.0);
                lines.add(
                    new Surroundings.LotLine(
                        b + declination_rad,
                        l.required("distance", Dimension.LENGTH, "The distance is missing.")));
                l.close();
              }
            });
    OptionalDouble wire = OptionalDouble.empty();
    Optional<Key> overhead = s.get("overhead-line");
    if (overhead.isPresent()) {
      wire = overhead.get().value("distance", Dimension.LENGTH);
      overhead.get().close();
    }
    Optional<Surroundings.Setback> setback =
        s.get("setback")
            .map(
                k -> {
                  Surroundings.Setback b =
                      new Surroundings.Setback(
                          k.text("of", "base"), k.value("multiplier", Dimension.ONE).orElse(1));
                  k.close();
                  return b;
                });
    Optional<Surroundings.Runway> runway =
        s.get("runway")
            .map(
                k ->
                    new Surroundings.Runway(
                        k.value("distance", Dimension.LENGTH).orElse(Double.NaN),
                        k.value("length", Dimension.LENGTH).orElse(Double.NaN)));
    runway.ifPresent(r -> s.get("runway").orElseThrow().close());
    Surroundings all =
        new Surroundings(
            lines, wire, runway, setback, s.positive("lowest-blade-rule", Dimension.LENGTH));
    s.close();
    return all;
  }

  private Basis basis(Key b) {
    String loads = b.need("loads", "missing", "Which loads?").map(Key::text).orElse("");
    String strength =
        b.need("strength", "missing", "Which strength standard?").map(Key::text).orElse("");
    if (!loads.isEmpty() && !loads.equals("iec-61400-2")) {
      boolean known = List.of("en-1991-1-4", "asce-7-16", "asce-7-22").contains(loads);
      b.get("loads")
          .orElseThrow()
          .error(
              known ? "basis-not-built" : "choice",
              known
                  ? loads + " is not calculated by this version."
                  : "\"" + loads + "\" is not a load basis known here.",
              "Write iec-61400-2.");
    }
    Basis.StrengthBasis s = null;
    for (Basis.StrengthBasis x : Basis.StrengthBasis.values()) {
      s = x.key().equals(strength) ? x : s;
    }
    if (s == null && !strength.isEmpty()) {
      b.get("strength")
          .orElseThrow()
          .error(
              "choice",
              "\"" + strength + "\" is not known.",
              "Write en-1993, aisc-360-16 or aisc-360-22.");
    }
    if (b.text("method", "lrfd").equals("asd")) {
      b.get("method")
          .orElseThrow()
          .error("choice", "asd is not calculated: its combinations are not built.", "Write lrfd.");
    }
    b.get("also")
        .ifPresent(
            k ->
                faults.open(
                    "also-not-built",
                    "basis.also",
                    "Further bases are named; this version calculates one.",
                    "Leave basis.also out, or have the other basis checked separately."));
    List<Basis.LoadBasis> also = new ArrayList<>();
    b.get("also")
        .ifPresent(list -> list.items().forEach(k -> loadBasis(k.text()).ifPresent(also::add)));
    Map<String, Double> nation = new LinkedHashMap<>();
    b.get("nation")
        .ifPresent(
            n -> {
              for (String key : KeyCatalogue.at(n.path()).orElseThrow().keys().keySet()) {
                n.positive(key, Dimension.ONE).ifPresent(v -> nation.put(key, v));
              }
              n.close();
            });
    Basis basis =
        new Basis(
            Basis.LoadBasis.IEC_61400_2,
            s == null ? Basis.StrengthBasis.EN_1993 : s,
            also,
            reliabilityClass(b),
            b.positive("service-life", Dimension.TIME).orElse(20 * 365.25 * 86400),
            b.choice("robust", "not-required").equals("required"),
            nation);
    if (basis.robust()) {
      faults.open(
          "robustness-not-built",
          "basis.robust",
          "The loss of a guy is not calculated by this version.",
          "");
    }
    b.close();
    return basis;
  }

  private static Optional<Basis.LoadBasis> loadBasis(String word) {
    for (Basis.LoadBasis x : Basis.LoadBasis.values()) {
      if (x.key().equals(word)) {
        return Optional.of(x);
      }
    }
    return Optional.empty();
  }

  private static int reliabilityClass(Key b) {
    int rc = b.integer("reliability-class", 2);
    if (rc < 1 || rc > 3) {
      b.get("reliability-class").orElseThrow().error("range", "is 1, 2 or 3.", "Write 2.");
    }
    return rc;
  }
}
