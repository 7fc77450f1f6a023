package org.mastwright.cli;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeSet;
import org.mastwright.assess.Assessor;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.design.Joint;
import org.mastwright.design.Rotor;
import org.mastwright.design.Site;
import org.mastwright.design.SiteWind;
import org.mastwright.design.Tower;
import org.mastwright.design.Tube;
import org.mastwright.design.Turbine;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;
import org.mastwright.units.UnitSystem;
import org.mastwright.working.DefaultTaken;
import org.mastwright.working.Finding;

/** What the program understood, in sentences, with the doubtful questions; nothing calculated. */
final class Readback {
  private static final double LONGEST_PIPE_M = 6.5;
  private static final double HERE_M = 0.05;

  private final Design d;
  private final UnitSystem units;
  private final List<Finding> findings;
  private final List<DefaultTaken> defaults;
  private final List<String> out = new ArrayList<>();

  private Readback(TowerFileInput input) {
    this.d = input.design();
    this.units = d.project().units();
    this.findings = input.findings();
    this.defaults = input.reading().defaults();
  }

  static List<String> of(TowerFileInput input, boolean plain) {
    Readback r = new Readback(input);
    Words.wrap(
        r.out,
        "",
        "mastwright "
            + Assessor.VERSION
            + "  readback  "
            + input.reading().fileName()
            + "   "
            + r.d.project().title());
    r.out.add("");
    r.out.add("  I read this:");
    r.tower();
    r.machine();
    r.site();
    r.out.add("");
    if (!plain) {
      r.out.addAll(SideView.of(r.d));
      r.out.add("");
    }
    r.questions();
    r.taken();
    r.out.add("");
    r.out.add("  Nothing was calculated. When this is right: mastwright check");
    r.out.add("  " + Words.CAUTION);
    return r.out.stream().map(l -> plain ? Words.ascii(l) : l).toList();
  }

  private void say(String head, String text) {
    Words.wrap(out, "  " + Words.pad(head, 9), text);
  }

  private String metres(double v) {
    return units.print(v, Unit.M);
  }

  private static String bearing(double rad) {
    return Numbers.fixed((Math.toDegrees(rad) + 360) % 360, 0) + "°";
  }

  private void tower() {
    Tower t = d.tower();
    List<String> parts = new ArrayList<>();
    for (Tube tube : t.tubes()) {
      parts.add(metres(tube.length_m()) + " of " + tube.label() + " (" + tube.steel().name() + ")");
    }
    say("Pipe", String.join(" + ", parts) + " = " + metres(t.length_m()) + ", bottom to top");
    String foot =
        switch (t.base().getClass().getSimpleName()) {
          case "Pinned" -> "free to lean every way";
          case "Fixed" -> "clamped";
          case "Hinged" ->
              "hinged, the pin lying "
                  + bearing(((Tower.BaseSupport.Hinged) t.base()).axisBearing_rad());
          default -> "on a spring";
        };
    say("Foot", foot + "; the pipe starts " + metres(t.footLevel_m()) + " above the ground");
    if (!t.guys().isEmpty()) {
      guys(t);
      anchors(t);
    } else {
      say("Guys", "none");
    }
  }

  private void guys(Tower t) {
    String head = "  " + Words.pad("Guys", 9);
    out.add(
        head
            + Words.pad("level", 7)
            + Words.pad("above ground", 20)
            + Words.pad("up the pipe", 20)
            + "guys, tension");
    for (int i = t.guys().size() - 1; i >= 0; i--) {
      GuySet g = t.guys().get(i);
      Words.wrap(
          out,
          " ".repeat(head.length())
              + Words.pad(String.valueOf(g.number()), 7)
              + Words.pad(metres(t.footLevel_m() + g.along_m()), 20)
              + Words.pad(metres(g.along_m()), 20),
          g.guys().size() + ", " + tension(g));
      Words.wrap(out, " ".repeat(head.length() + 7), g.rope().label() + ", " + ends(g));
    }
  }

  private static String ends(GuySet g) {
    int n = g.ends().count();
    return n > 0 ? n + " " + g.ends().kind() : g.ends().kind();
  }

  private String tension(GuySet g) {
    String end = g.tensionAtAnchor() ? " at the anchor" : " at the mast";
    if (g.tension() instanceof GuySet.Tension.Force f) {
      return String.join(
              ", ", f.values_N().stream().map(v -> units.print(v, Unit.N)).distinct().toList())
          + end;
    }
    if (g.tension() instanceof GuySet.Tension.OfBreaking s) {
      return Unit.PERCENT.print(s.fraction()) + " of breaking";
    }
    if (g.tension() instanceof GuySet.Tension.Sag s) {
      return units.print(s.sag_m(), Unit.MM) + " sag";
    }
    if (g.tension() instanceof GuySet.Tension.Pulse p) {
      return p.returns() + " returns in " + Unit.S.print(p.time_s());
    }
    return "snug (2 %)";
  }

  private void anchors(Tower t) {
    Map<Integer, TreeSet<Integer>> levels = new LinkedHashMap<>();
    for (GuySet g : t.guys()) {
      for (GuySet.Guy guy : g.guys()) {
        levels.computeIfAbsent(guy.anchor(), k -> new TreeSet<>()).add(g.number());
      }
    }
    int guys = t.guys().stream().mapToInt(g -> g.guys().size()).sum();
    say(
        "Pull",
        levels.size() == guys
            ? "each guy has an anchor of its own: " + Words.count(guys, "anchor")
            : guys + " guys end at " + Words.count(levels.size(), "anchor") + ", not " + guys);
    levels.forEach(
        (index, sets) -> {
          Ground.Anchor a = d.ground().anchors().get(index);
          say(
              "",
              a.name()
                  + ": "
                  + bearing(a.bearing_rad())
                  + ", "
                  + metres(a.out_m())
                  + " out, eye "
                  + eye(a.up_m())
                  + ", "
                  + a.kind().key()
                  + ", guys of level "
                  + String.join(", ", sets.stream().map(String::valueOf).toList()));
        });
  }

  private String eye(double up_m) {
    if (Math.abs(up_m) < 1e-6) {
      return "at ground level";
    }
    return metres(Math.abs(up_m)) + (up_m > 0 ? " above" : " below") + " it";
  }

  private void machine() {
    if (d.turbine().isEmpty()) {
      return;
    }
    Turbine m = d.turbine().get();
    Rotor r = m.rotor();
    say(
        "Machine",
        r.kind().key()
            + ", "
            + Words.count(r.blades(), "blade")
            + ", "
            + metres(r.diameter_m())
            + " across, "
            + r.position().name().toLowerCase(Locale.ROOT)
            + "; "
            + units.print(m.mass_kg(), Unit.KG)
            + " in all; "
            + Unit.KW.print(m.rated().power_W())
            + " at "
            + units.print(m.rated().wind_mps(), Unit.MPS)
            + " and "
            + Unit.RPM.print(m.rated().omega_radps())
            + "; kept from overspeed by: "
            + m.controlledBy().key());
    double hub = d.tower().topHeight_m() + m.head().hubAboveTop_m();
    say(
        "",
        "hub "
            + metres(hub)
            + " up, blades from "
            + metres(hub - r.radius_m())
            + " to "
            + metres(hub + r.radius_m())
            + "; rotor turns "
            + Unit.RPM.print(m.rotorSpeed().lowest_radps())
            + " to "
            + Unit.RPM.print(m.rotorSpeed().highest_radps()));
  }

  private void site() {
    if (d.site().isEmpty()) {
      return;
    }
    Site s = d.site().get();
    if (s.wind().stated() instanceof SiteWind.Stated.Speed v) {
      String level =
          v.level() instanceof SiteWind.Level.Ultimate u
              ? "ultimate, category " + u.riskCategory()
              : "met once in " + Numbers.significant(v.level().returnPeriod_yr(), 3) + " years";
      say(
          "Wind",
          units.print(v.speed_mps(), Unit.MPS)
              + " averaged over "
              + v.averaging().key()
              + ", "
              + level
              + ", "
              + metres(v.height_m())
              + " above the ground");
    } else if (s.wind().stated() instanceof SiteWind.Stated.IecClass c) {
      say("Wind", "IEC 61400-2 class " + c.name());
    }
    String ice =
        s.ice() instanceof Site.Ice.None
            ? "none, as stated"
            : s.ice() instanceof Site.Ice.NotStated
                ? "nobody said; none is calculated"
                : s.ice() instanceof Site.Ice.Thickness i
                    ? units.print(i.thickness_m(), Unit.MM)
                        + " "
                        + i.kind().name().toLowerCase(Locale.ROOT)
                    : "class " + ((Site.Ice.IsoClass) s.ice()).icingClass();
    say("Ice", ice);
    d.basis().ifPresent(b -> say("Basis", b.loads().title() + " with " + b.strength().title()));
  }

  private void ask(String question) {
    say("ASK", question);
  }

  private void questions() {
    Tower t = d.tower();
    for (Tube tube : t.tubes()) {
      boolean joined =
          t.joints().stream().anyMatch(j -> Math.abs(j.along_m() - tube.top_m()) < HERE_M);
      boolean top = tube.top_m() > t.length_m() - HERE_M;
      if (!joined && !top) {
        ask(
            "two pipes meet "
                + metres(t.footLevel_m() + tube.top_m())
                + " up and no joint is named there. Threaded, welded, sleeved?");
      }
      if (tube.length_m() > LONGEST_PIPE_M) {
        ask(
            "one pipe is "
                + metres(tube.length_m())
                + " long; pipe is sold in lengths up to "
                + metres(LONGEST_PIPE_M)
                + ". Is there a joint in it?");
      }
    }
    if (t.joints().stream().noneMatch(j -> j.along_m() < HERE_M && j.kind() != Joint.Kind.PINNED)
        && t.base() instanceof Tower.BaseSupport.Fixed) {
      ask("the foot is clamped and no base plate is described. What holds it?");
    }
    for (Ground.Anchor a : d.ground().anchors()) {
      if (Math.abs(a.up_m()) > 0.2) {
        ask(
            a.name()
                + " anchor eye "
                + metres(Math.abs(a.up_m()))
                + (a.up_m() > 0 ? " above" : " below")
                + " the mast foot: the eye, or the ground there?");
      }
    }
    for (GuySet g : t.guys()) {
      if (g.tension() instanceof GuySet.Tension.Snug) {
        ask("level " + g.number() + " is set snug: can you measure the tension, sag or pulse?");
      }
    }
    for (Finding f : findings) {
      if (f.severity() == Finding.Severity.WARNING) {
        ask("line " + f.line() + ", " + f.path() + ": " + f.message() + " " + f.remedy());
      }
    }
    for (Finding f : findings) {
      if (f.severity() == Finding.Severity.OPEN_POINT) {
        say("OPEN", f.message() + " " + f.remedy());
      }
    }
  }

  private void taken() {
    if (!defaults.isEmpty()) {
      out.add("");
      out.add("  Not given, and what will be taken instead (side it errs on):");
      for (DefaultTaken t : defaults) {
        Words.wrap(out, "    ", t.path() + ": " + t.value() + " (" + t.side().word() + ")");
      }
    }
    List<String> unused =
        findings.stream()
            .filter(f -> f.id().equals("read-not-used"))
            .map(Finding::path)
            .distinct()
            .toList();
    if (!unused.isEmpty()) {
      Words.wrap(out, "  ", "Read, not yet used: " + String.join(", ", unused) + ".");
    }
  }
}
