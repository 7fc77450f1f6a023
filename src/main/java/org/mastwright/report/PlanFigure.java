package org.mastwright.report;

import java.util.List;
import java.util.stream.Collectors;
import org.mastwright.assess.Assessment;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.design.Surroundings;
import org.mastwright.design.Tower;
import org.mastwright.units.Unit;

/** The tower from above, north up: anchors, fall circle, lot lines. */
final class PlanFigure {
  private static final double WIDTH = 136;
  private static final double HEIGHT = 136;
  private static final double ROOM = 55;

  private final Svg svg = new Svg(WIDTH, HEIGHT);
  private final Assessment a;
  private final Design d;
  private final Print print;
  private final int ratio;

  private PlanFigure(Assessment a, Print print) {
    this.a = a;
    this.d = a.design();
    this.print = print;
    double furthest =
        d.ground().anchors().stream().mapToDouble(Ground.Anchor::out_m).max().orElse(0);
    double fall = a.outline().fallRadius_m();
    double shown = furthest > fall ? furthest : fall;
    this.ratio = Scale.ratio(shown, ROOM, shown, ROOM);
  }

  static Figure of(Assessment a, Print print) {
    PlanFigure f = new PlanFigure(a, print);
    f.draw();
    String words = f.words();
    return new Figure(f.svg.end(words), words);
  }

  private double x(double east_m) {
    return WIDTH / 2 + Scale.paper_mm(east_m, ratio);
  }

  private double y(double north_m) {
    return 64 - Scale.paper_mm(north_m, ratio);
  }

  private void draw() {
    fallCircle();
    d.surroundings().lotLines().forEach(this::lotLine);
    guysAndAnchors();
    svg.circle(x(0), y(0), 0.9, Svg.INK);
    if (d.tower().base() instanceof Tower.BaseSupport.Hinged h) {
      double e = Scale.paper_mm(1, ratio) < 3 ? 3 * ratio / 1000.0 : 1;
      svg.line(
          x(-Scale.east(h.axisBearing_rad(), e)),
          y(-Scale.north(h.axisBearing_rad(), e)),
          x(Scale.east(h.axisBearing_rad(), e)),
          y(Scale.north(h.axisBearing_rad(), e)),
          Svg.INK.thick(0.5));
    }
    north();
    scaleBar();
  }

  private void fallCircle() {
    double radius = Scale.paper_mm(a.outline().fallRadius_m(), ratio);
    svg.circle(x(0), y(0), radius, Svg.RUST);
    svg.text(
        x(0) + radius * 0.71 + 1,
        y(0) + radius * 0.71 + 2.5,
        2.4,
        "fall circle, " + print.one(a.outline().fallRadius_m(), Unit.M));
    a.outline()
        .reach_m()
        .ifPresent(r -> svg.circle(x(0), y(0), Scale.paper_mm(r, ratio), Svg.GREEN));
  }

  private void guysAndAnchors() {
    List<Ground.Anchor> anchors = d.ground().anchors();
    for (GuySet set : d.tower().guys()) {
      for (GuySet.Guy guy : set.guys()) {
        Ground.Anchor anchor = anchors.get(guy.anchor());
        svg.line(x(0), y(0), x(anchor.east_m()), y(anchor.north_m()), Svg.INK.thick(0.15));
      }
    }
    for (Ground.Anchor anchor : anchors) {
      double px = x(anchor.east_m());
      double py = y(anchor.north_m());
      svg.rect(px - 1, py - 1, 2, 2, Svg.INK.thick(0.2), "#ffffff");
      String label = anchor.name() + ", " + print.one(anchor.out_m(), Unit.M);
      boolean leftHalf = anchor.east_m() < 0;
      double ly = anchor.north_m() < 0 ? py + 4 : py - 2.2;
      if (leftHalf) {
        svg.textEnd(px + 4, ly, 2.4, label);
      } else {
        svg.text(px - 4, ly, 2.4, label);
      }
    }
  }

  /** Drawn only where it falls on the sheet; its distance stands in the caption in any case. */
  private void lotLine(Surroundings.LotLine line) {
    double distance = Scale.paper_mm(line.distance_m(), ratio);
    if (distance > 62) {
      return;
    }
    double cx = WIDTH / 2 + Scale.east(line.bearing_rad(), distance);
    double cy = 64 - Scale.north(line.bearing_rad(), distance);
    double along = line.bearing_rad() + Unit.DEG.toSi(90);
    double half = 40;
    svg.line(
        cx - Scale.east(along, half),
        cy + Scale.north(along, half),
        cx + Scale.east(along, half),
        cy - Scale.north(along, half),
        Svg.INK.dashed("4 1 0.6 1"));
    svg.textMiddle(cx, cy - 1.4, 2.4, "lot line, " + print.one(line.distance_m(), Unit.M));
  }

  private void north() {
    svg.line(128, 18, 128, 4, Svg.INK);
    svg.polygon(
        List.of(new Svg.Point(128, 3), new Svg.Point(126.6, 7), new Svg.Point(129.4, 7)),
        Svg.INK,
        Svg.INK_COLOUR);
    svg.textMiddle(128, 22, 3, "N");
  }

  private void scaleBar() {
    Unit unit = print.first(Unit.M);
    double long_m = unit.toSi(Scale.roundBelow(unit.fromSi(35.0 * ratio / 1000)));
    double length = Scale.paper_mm(long_m, ratio);
    double y = 130;
    svg.line(3, y, 3 + length, y, Svg.INK);
    svg.line(3, y - 0.8, 3, y + 0.8, Svg.INK);
    svg.line(3 + length, y - 0.8, 3 + length, y + 0.8, Svg.INK);
    svg.text(5 + length, y + 0.8, 2.4, Axes.tick(unit.fromSi(long_m)) + " " + unit.symbol());
    svg.text(3, y + 4, 2.4, "1 to " + ratio + ", north up");
  }

  private String words() {
    String anchors =
        d.ground().anchors().stream()
            .map(
                x ->
                    x.name()
                        + " "
                        + print.of(x.out_m(), Unit.M)
                        + " on "
                        + Print.bearing(x.bearing_rad()))
            .collect(Collectors.joining("; "));
    String lots =
        d.surroundings().lotLines().stream()
            .map(l -> print.of(l.distance_m(), Unit.M) + " on " + Print.bearing(l.bearing_rad()))
            .collect(Collectors.joining("; "));
    return "Plan, north up, 1 to "
        + ratio
        + ". Broken circle: everything within "
        + print.of(a.outline().fallRadius_m(), Unit.M)
        + " can be struck when the tower falls. Dotted circle: reach of the blades. "
        + (anchors.isEmpty() ? "No anchors. " : "Anchors: " + anchors + ". ")
        + (lots.isEmpty() ? "Lot lines not given. " : "Lot lines: " + lots + ". ")
        + "Overhead line: "
        + print.of(d.surroundings().overheadLine_m(), Unit.M)
        + ".";
  }
}
