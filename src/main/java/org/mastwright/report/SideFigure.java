package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.Outline;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.design.Joint;
import org.mastwright.design.Rotor;
import org.mastwright.design.Tower;
import org.mastwright.design.Tube;
import org.mastwright.design.Turbine;
import org.mastwright.units.Unit;

/** The tower from the side, to scale, with the letters that the tables use. */
final class SideFigure {
  private static final double MARGIN_ABOVE = 5;
  private static final double BELOW_GROUND = 11;
  private static final double LETTER_ROOM = 4.6;
  private static final double ROOM_BESIDE = 4.4;

  private final Svg svg;
  private final Assessment a;
  private final Design d;
  private final Print print;
  private final int ratio;
  private final double axis;
  private final double ground;
  private final double groundTo;
  private final ToDoubleFunction<Ground.Anchor> across;
  private final boolean lettered;

  private SideFigure(
      Assessment a,
      Print print,
      double width,
      double room,
      double height,
      ToDoubleFunction<Ground.Anchor> across,
      boolean lettered) {
    this.a = a;
    this.d = a.design();
    this.print = print;
    this.across = across;
    this.lettered = lettered;
    double left = reach(a, across, -1);
    double right = reach(a, across, 1);
    this.ratio =
        Scale.ratio(
            left + right,
            room - 2 * ROOM_BESIDE,
            top_m(a.outline()),
            height - MARGIN_ABOVE - BELOW_GROUND);
    double drawn = Scale.paper_mm(left + right, ratio);
    this.axis = (room - drawn) / 2 + Scale.paper_mm(left, ratio);
    this.ground = MARGIN_ABOVE + Scale.paper_mm(top_m(a.outline()), ratio);
    this.groundTo = room - 2;
    this.svg = new Svg(width, ground + BELOW_GROUND);
  }

  /** The lettered side view of the first page. */
  static Figure answer(Assessment a, Print print) {
    SideFigure f = new SideFigure(a, print, 64, 64, 104, Ground.Anchor::east_m, true);
    f.draw();
    String words = f.legend();
    return new Figure(f.svg.end("Side view from the south, to scale. " + words), words);
  }

  /** Two side views, from the south and from the west, with heights. */
  static List<Figure> elevations(Assessment a, Print print) {
    List<Figure> figures = new ArrayList<>();
    figures.add(elevation(a, print, Ground.Anchor::east_m, "from the south, east to the right"));
    if (!a.design().ground().anchors().isEmpty()) {
      figures.add(elevation(a, print, x -> -x.north_m(), "from the west, south to the right"));
    }
    return figures;
  }

  private static Figure elevation(
      Assessment a, Print print, ToDoubleFunction<Ground.Anchor> across, String from) {
    SideFigure f = new SideFigure(a, print, 136, 97, 100, across, false);
    f.heights();
    f.draw();
    String words = "Side view " + from + ", 1 to " + f.ratio + ". " + f.summary();
    return new Figure(f.svg.end(words), words);
  }

  private static double top_m(Outline o) {
    return o.highestBlade_m().orElse(o.mastTop_m());
  }

  /** How far the picture reaches to one side: the furthest anchor or the blades. */
  private static double reach(Assessment a, ToDoubleFunction<Ground.Anchor> across, int side) {
    double blades = a.outline().reach_m().orElse(1);
    double furthest =
        a.design().ground().anchors().stream()
            .mapToDouble(x -> side * across.applyAsDouble(x))
            .max()
            .orElse(0);
    return furthest > blades ? furthest : blades;
  }

  private double x(double across_m) {
    return axis + Scale.paper_mm(across_m, ratio);
  }

  private double y(double height_m) {
    return ground - Scale.paper_mm(height_m, ratio);
  }

  private void draw() {
    svg.line(2, ground, groundTo, ground, Svg.INK.thick(0.2));
    guys();
    mast();
    d.turbine().ifPresent(this::machine);
    scaleBar();
    if (lettered) {
      letters();
    }
  }

  private void guys() {
    List<Ground.Anchor> anchors = d.ground().anchors();
    for (GuySet set : d.tower().guys()) {
      double level = y(d.tower().footLevel_m() + set.along_m());
      for (GuySet.Guy guy : set.guys()) {
        Ground.Anchor anchor = anchors.get(guy.anchor());
        double out = across.applyAsDouble(anchor);
        if (Scale.size(out) > 0.02 * anchor.out_m()) {
          svg.line(x(out), y(anchor.up_m()), axis, level, Svg.INK.thick(0.15));
        }
      }
    }
    for (Ground.Anchor anchor : anchors) {
      double px = x(across.applyAsDouble(anchor));
      double py = y(anchor.up_m());
      svg.polygon(
          List.of(
              new Svg.Point(px, py), new Svg.Point(px - 1, py + 2), new Svg.Point(px + 1, py + 2)),
          Svg.INK.thick(0.2),
          "#ffffff");
    }
  }

  private void mast() {
    Tower tower = d.tower();
    double foot = tower.footLevel_m();
    for (Tube tube : tower.tubes()) {
      double low = half(tube.bottom().outside_m());
      double high = half(tube.top().outside_m());
      double bottom = y(foot + tube.bottom_m());
      double top = y(foot + tube.top_m());
      svg.polygon(
          List.of(
              new Svg.Point(axis - low, bottom),
              new Svg.Point(axis + low, bottom),
              new Svg.Point(axis + high, top),
              new Svg.Point(axis - high, top)),
          Svg.INK.thick(0.18),
          "#e9edf1");
    }
    for (Joint joint : tower.joints()) {
      double level = y(foot + joint.along_m());
      svg.line(axis - 1.3, level, axis + 1.3, level, Svg.INK);
    }
    svg.rect(axis - 2.4, y(foot), 4.8, ground + 2 - y(foot), Svg.INK.thick(0.2), "#ffffff");
  }

  /** Half a tube on paper; never thinner than can be seen. */
  private double half(double outside_m) {
    double paper = Scale.paper_mm(outside_m, ratio) / 2;
    return paper < 0.35 ? 0.35 : paper;
  }

  private void machine(Turbine t) {
    Rotor r = t.rotor();
    double top = y(a.outline().mastTop_m());
    if (r.upright().isPresent()) {
      double low = y(a.outline().lowestBlade_m().orElse(0));
      double high = y(a.outline().highestBlade_m().orElse(0));
      double radius = Scale.paper_mm(r.radius_m(), ratio);
      svg.line(axis, top, axis, high, Svg.INK);
      if (r.kind() == Rotor.Kind.DARRIEUS) {
        svg.ellipse(axis, (low + high) / 2, radius, (low - high) / 2, Svg.BLUE, Svg.NONE);
      } else {
        svg.rect(axis - radius, high, 2 * radius, low - high, Svg.BLUE, Svg.NONE);
      }
      return;
    }
    double hub = y(a.outline().hub_m().orElse(0));
    int side = r.position() == Rotor.Position.UPWIND ? -1 : 1;
    double plane = axis + side * Scale.paper_mm(r.overhang_m(), ratio);
    double radius = Scale.paper_mm(r.radius_m(), ratio);
    svg.line(axis, top, axis, hub, Svg.INK);
    svg.line(plane, hub, axis, hub, Svg.INK.thick(0.7));
    svg.ellipse(plane, hub, 0.7, radius, Svg.BLUE, Svg.NONE);
    t.tail()
        .ifPresent(
            tail -> {
              double end = axis - side * Scale.paper_mm(tail.arm_m(), ratio);
              svg.line(axis, hub, end, hub, Svg.INK);
              svg.rect(end - 1, hub - 1.6, 2, 3.2, Svg.INK.thick(0.18), "#ffffff");
            });
  }

  private void scaleBar() {
    Unit unit = print.first(Unit.M);
    double long_m = unit.toSi(Scale.roundBelow(unit.fromSi(25.0 * ratio / 1000)));
    double length = Scale.paper_mm(long_m, ratio);
    double y = ground + 6.5;
    double from = 3;
    svg.line(from, y, from + length, y, Svg.INK);
    svg.line(from, y - 0.8, from, y + 0.8, Svg.INK);
    svg.line(from + length, y - 0.8, from + length, y + 0.8, Svg.INK);
    svg.text(
        from + length + 1.5, y + 0.8, 2.3, Axes.tick(unit.fromSi(long_m)) + " " + unit.symbol());
    svg.text(from, y + 4, 2.3, "1 to " + ratio);
  }

  private void letters() {
    Outline o = a.outline();
    if (d.turbine().isPresent()) {
      svg.letter(axis + 8, y(o.hub_m().orElse(o.mastTop_m())) - 3.4, "A");
    }
    double foot = d.tower().footLevel_m();
    double last = ground;
    for (GuySet set : d.tower().guys()) {
      double level = y(foot + set.along_m());
      if (last - level > LETTER_ROOM) {
        svg.letter(axis - 5, level, "B");
        last = level;
      }
    }
    svg.letter(axis + 4.4, y(foot + d.tower().length_m() * 0.22), "C");
    List<Ground.Anchor> anchors = d.ground().anchors();
    for (Ground.Anchor anchor : anchors) {
      double out = across.applyAsDouble(anchor);
      if (Scale.size(out) > 0.3 * anchor.out_m()) {
        svg.letter(x(out) + (out > 0 ? 1.6 : -1.6), y(anchor.up_m()) - 4.4, "D");
      }
    }
    svg.letter(axis + 6, ground + 4, "E");
  }

  private void heights() {
    Outline o = a.outline();
    List<Mark> marks = new ArrayList<>();
    mark(marks, "highest blade tip", o.highestBlade_m());
    mark(marks, "hub", o.hub_m());
    mark(marks, "lowest blade tip", o.lowestBlade_m());
    mark(marks, "mast top", OptionalDouble.of(o.mastTop_m()));
    double foot = d.tower().footLevel_m();
    d.tower()
        .guys()
        .forEach(
            s -> mark(marks, "guy level " + s.number(), OptionalDouble.of(foot + s.along_m())));
    mark(marks, "foot", OptionalDouble.of(foot));
    marks.sort(java.util.Comparator.comparingDouble((Mark m) -> -m.height_m()));
    double last = -10;
    for (Mark m : marks) {
      double at = y(m.height_m());
      double label = at < last + 3.1 ? last + 3.1 : at;
      svg.line(axis + 3, at, 99, at, Svg.FAINT);
      svg.line(99, at, 101, label, Svg.FAINT);
      svg.text(101.5, label + 0.8, 2.2, print.one(m.height_m(), Unit.M) + "  " + m.name());
      last = label;
    }
  }

  private record Mark(String name, double height_m) {}

  private static void mark(List<Mark> marks, String name, OptionalDouble height_m) {
    height_m.ifPresent(h -> marks.add(new Mark(name, h)));
  }

  private String legend() {
    List<String> parts = new ArrayList<>();
    a.outline()
        .hub_m()
        .ifPresent(h -> parts.add("A machine, rotor centre at " + print.of(h, Unit.M)));
    if (!d.tower().guys().isEmpty()) {
      parts.add("B guy levels");
    }
    parts.add("C mast, top at " + print.of(a.outline().mastTop_m(), Unit.M));
    if (!d.ground().anchors().isEmpty()) {
      parts.add("D anchors");
    }
    parts.add("E foot and footing");
    if (d.raising().isPresent()) {
      parts.add("F raising gear, not drawn");
    }
    return String.join("; ", parts) + ". Seen from the south, 1 to " + ratio + ".";
  }

  private String summary() {
    Outline o = a.outline();
    String blades =
        o.lowestBlade_m().isPresent()
            ? "; blades from "
                + print.of(o.lowestBlade_m(), Unit.M)
                + " to "
                + print.of(o.highestBlade_m(), Unit.M)
            : "";
    return "Mast top at " + print.of(o.mastTop_m(), Unit.M) + blades + ", above ground.";
  }
}
