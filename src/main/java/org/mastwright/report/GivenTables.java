package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.design.Joint;
import org.mastwright.design.Tube;
import org.mastwright.units.Unit;

/** Tubes, joints, guys and anchors as given. */
final class GivenTables {
  private final Print print;

  private GivenTables(Print print) {
    this.print = print;
  }

  static List<Table> of(Design d, Print print) {
    GivenTables g = new GivenTables(print);
    List<Table> tables = new ArrayList<>();
    tables.add(g.tubes(d.tower().tubes()));
    tables.add(g.steels(d.tower().tubes()));
    tables.add(g.joints(d.tower().joints()));
    tables.add(g.guys(d.tower().guys(), d.ground()));
    tables.add(g.ropes(d.tower().guys()));
    tables.add(g.anchors(d.ground().anchors()));
    return tables.stream().filter(Table::filled).toList();
  }

  private Table tubes(List<Tube> tubes) {
    return Table.of("Tubes, bottom to top, along the mast from its foot")
        .words("tube", tubes.stream().map(Tube::label).toList())
        .numbers(
            print.head("from", Unit.M),
            print.column(tubes.stream().map(Tube::bottom_m).toList(), Unit.M))
        .numbers(
            print.head("to", Unit.M),
            print.column(tubes.stream().map(Tube::top_m).toList(), Unit.M))
        .numbers(
            print.head("outside", Unit.MM),
            tubes.stream()
                .map(t -> ends(t.bottom().outside_m(), t.top().outside_m(), Unit.MM))
                .toList())
        .numbers(
            print.head("wall", Unit.MM),
            tubes.stream().map(t -> ends(t.bottom().wall_m(), t.top().wall_m(), Unit.MM)).toList())
        .brief(
            "shape",
            tubes.stream()
                .map(t -> t.bottom().isRound() ? "round" : t.bottom().sides() + " sides")
                .toList())
        .build();
  }

  /** One value, or the two ends of a taper. */
  private String ends(double bottom, double top, Unit unit) {
    List<String> both = print.column(List.of(bottom, top), unit);
    return bottom == top ? both.get(0) : both.get(0) + " to " + both.get(1);
  }

  private Table steels(List<Tube> tubes) {
    List<Tube.Steel> steels = tubes.stream().map(Tube::steel).distinct().toList();
    return Table.of("Steels")
        .words(
            "steel", steels.stream().map(s -> s.name() + (s.assumed() ? ", assumed" : "")).toList())
        .numbers(
            print.head("yield", Unit.MPA),
            print.column(steels.stream().map(Tube.Steel::yield_Pa).toList(), Unit.MPA))
        .numbers(
            print.head("ultimate", Unit.MPA),
            print.column(steels.stream().map(Tube.Steel::ultimate_Pa).toList(), Unit.MPA))
        .numbers(
            print.head("modulus", Unit.GPA),
            print.column(steels.stream().map(Tube.Steel::modulus_Pa).toList(), Unit.GPA))
        .words("source", steels.stream().map(Tube.Steel::source).toList())
        .build();
  }

  private Table joints(List<Joint> joints) {
    return Table.of("Joints")
        .numbers(
            print.head("along the mast", Unit.M),
            print.column(joints.stream().map(Joint::along_m).toList(), Unit.M))
        .brief("kind", joints.stream().map(j -> j.kind().key()).toList())
        .numbers(
            "bolts",
            joints.stream().map(j -> j.bolts() == 0 ? "–" : String.valueOf(j.bolts())).toList())
        .words("dimensions", joints.stream().map(this::dimensions).toList())
        .build();
  }

  private String dimensions(Joint joint) {
    List<String> parts = new ArrayList<>();
    joint.lengths().entrySet().stream()
        .sorted(java.util.Map.Entry.comparingByKey())
        .forEach(e -> parts.add(e.getKey() + " " + print.of(e.getValue(), Unit.MM)));
    joint.preload_N().ifPresent(preload -> parts.add("preload " + print.of(preload, Unit.KN)));
    joint.words().entrySet().stream()
        .sorted(java.util.Map.Entry.comparingByKey())
        .forEach(e -> parts.add(e.getKey() + " " + e.getValue()));
    return parts.isEmpty() ? "–" : String.join(", ", parts);
  }

  private Table guys(List<GuySet> sets, Ground ground) {
    return Table.of("Guys, by level from the lowest")
        .numbers("level", sets.stream().map(s -> String.valueOf(s.number())).toList())
        .numbers(
            print.head("along the mast", Unit.M),
            print.column(sets.stream().map(GuySet::along_m).toList(), Unit.M))
        .words("anchors", sets.stream().map(s -> anchorNames(s, ground)).toList())
        .words("tension", sets.stream().map(s -> tension(s.tension())).toList())
        .words(
            "ends",
            sets.stream()
                .map(
                    s ->
                        s.ends().kind()
                            + (s.ends().count() > 0 ? " × " + s.ends().count() : "")
                            + ", efficiency "
                            + Print.factor(s.ends().efficiencyRatio())
                            + (s.ends().assumed() ? " assumed" : ""))
                .toList())
        .build();
  }

  private static String anchorNames(GuySet set, Ground ground) {
    return set.guys().stream()
        .map(
            g ->
                g.anchor() >= 0 && g.anchor() < ground.anchors().size()
                    ? ground.anchors().get(g.anchor()).name()
                    : Print.bearing(g.azimuth_rad()))
        .collect(Collectors.joining(", "));
  }

  private String tension(GuySet.Tension tension) {
    if (tension instanceof GuySet.Tension.Force f) {
      return f.values_N().stream().map(v -> print.of(v, Unit.KN)).collect(Collectors.joining(", "));
    }
    if (tension instanceof GuySet.Tension.OfBreaking b) {
      return print.of(b.fraction(), Unit.PERCENT) + " of breaking";
    }
    if (tension instanceof GuySet.Tension.Sag s) {
      return "sag " + print.of(s.sag_m(), Unit.MM);
    }
    if (tension instanceof GuySet.Tension.Pulse p) {
      return p.returns() + " returns in " + print.of(p.time_s(), Unit.S);
    }
    return "snug";
  }

  private Table ropes(List<GuySet> sets) {
    List<GuySet.Rope> ropes = sets.stream().map(GuySet::rope).distinct().toList();
    return Table.of("Ropes and strands")
        .words("rope", ropes.stream().map(GuySet.Rope::label).toList())
        .numbers(
            print.head("diameter", Unit.MM),
            print.column(ropes.stream().map(GuySet.Rope::diameter_m).toList(), Unit.MM))
        .numbers(
            print.head("metal", Unit.MM2),
            print.column(ropes.stream().map(GuySet.Rope::area_m2).toList(), Unit.MM2))
        .numbers(
            print.head("modulus", Unit.GPA),
            print.column(ropes.stream().map(GuySet.Rope::modulus_Pa).toList(), Unit.GPA))
        .numbers(
            print.head("breaking", Unit.KN),
            print.column(ropes.stream().map(GuySet.Rope::breaking_N).toList(), Unit.KN))
        .words("source", ropes.stream().map(GuySet.Rope::source).toList())
        .build();
  }

  private Table anchors(List<Ground.Anchor> anchors) {
    return Table.of("Anchors, from the mast axis; bearings from true north")
        .words("anchor", anchors.stream().map(Ground.Anchor::name).toList())
        .numbers("bearing", anchors.stream().map(x -> Print.bearing(x.bearing_rad())).toList())
        .numbers(
            print.head("out", Unit.M),
            print.column(anchors.stream().map(Ground.Anchor::out_m).toList(), Unit.M))
        .numbers(
            print.head("eye above ground", Unit.M),
            print.column(anchors.stream().map(Ground.Anchor::up_m).toList(), Unit.M))
        .words("kind", anchors.stream().map(x -> kind(x.kind())).toList())
        .build();
  }

  private String kind(Ground.Kind kind) {
    if (kind instanceof Ground.Kind.Tested t) {
      return "tested, held "
          + print.of(t.held_N(), Unit.KN)
          + " for "
          + print.of(t.time_s(), Unit.MIN)
          + (t.failed() ? ", gave way" : "");
    }
    if (kind instanceof Ground.Kind.Block b) {
      return "block "
          + String.join(
              " × ",
              List.of(
                  print.one(b.length_m(), Unit.M),
                  print.one(b.width_m(), Unit.M),
                  print.one(b.height_m(), Unit.M)));
    }
    if (kind instanceof Ground.Kind.Screw s) {
      return "screw, helix " + print.of(s.helix_m(), Unit.MM);
    }
    return kind.key().toLowerCase(Locale.ROOT);
  }
}
