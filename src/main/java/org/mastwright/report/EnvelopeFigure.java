package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.EnvelopePoint;
import org.mastwright.design.GuySet;
import org.mastwright.units.Unit;

/** Greatest compression, shear, moment and movement over height, side by side. */
final class EnvelopeFigure {
  private static final double WIDTH = 136;
  private static final double HEIGHT = 106;
  private static final double TOP = 8;
  private static final double FOOT = 95;
  private static final double LEFT = 14;
  private static final double PANEL = 25;
  private static final double GAP = 6;

  private record Quantity(String name, ToDoubleFunction<EnvelopePoint> value, Unit unit) {}

  private static final List<Quantity> QUANTITIES =
      List.of(
          new Quantity("compression", EnvelopePoint::compression_N, Unit.KN),
          new Quantity("shear", EnvelopePoint::shear_N, Unit.KN),
          new Quantity("moment", EnvelopePoint::moment_Nm, Unit.KNM),
          new Quantity("movement", EnvelopePoint::movement_m, Unit.MM));

  private EnvelopeFigure() {}

  static Optional<Figure> of(Assessment a, Print print) {
    List<EnvelopePoint> points = a.envelope();
    if (points.size() < 2) {
      return Optional.empty();
    }
    Unit length = print.first(Unit.M);
    double top = points.stream().mapToDouble(EnvelopePoint::height_m).max().orElse(1);
    Scale y = Scale.fromZero(length.fromSi(top), FOOT, TOP, 8);
    Svg svg = new Svg(WIDTH, HEIGHT);
    for (int i = 0; i < QUANTITIES.size(); i++) {
      panel(svg, QUANTITIES.get(i), points, y, LEFT + i * (PANEL + GAP), i == 0, print);
    }
    double foot = a.design().tower().footLevel_m();
    for (GuySet set : a.design().tower().guys()) {
      double level = y.at(length.fromSi(foot + set.along_m()));
      svg.line(LEFT, level, WIDTH - 4, level, Svg.HAIR.dashed("0.8 0.8"));
      svg.text(WIDTH - 3.5, level + 0.8, 2.1, "start", Svg.QUIET_COLOUR, 0, "B" + set.number());
    }
    String caption = caption(points, print) + (a.design().tower().guys().isEmpty() ? "" : GUYS);
    return Optional.of(new Figure(svg.end("Four charts over height. " + caption), caption));
  }

  private static final String GUYS = " Broken lines: the guy levels.";

  private static void panel(
      Svg svg,
      Quantity q,
      List<EnvelopePoint> points,
      Scale y,
      double left,
      boolean first,
      Print print) {
    Unit unit = print.first(q.unit());
    Unit length = print.first(Unit.M);
    double most = points.stream().mapToDouble(q.value()).max().orElse(0);
    Scale x = Scale.fromZero(unit.fromSi(most), left, left + PANEL, 3);
    if (first) {
      Axes.side(svg, y, left, left + PANEL, 8, "height above ground, " + length.symbol());
    } else {
      Axes.grid(svg, y, left, left + PANEL, 8);
    }
    Axes.foot(svg, x, TOP, FOOT, 3, q.name() + ", " + unit.symbol());
    List<Svg.Point> curve = new ArrayList<>();
    for (EnvelopePoint p : points) {
      double value = unit.fromSi(q.value().applyAsDouble(p));
      curve.add(new Svg.Point(x.at(value < 0 ? 0 : value), y.at(length.fromSi(p.height_m()))));
    }
    List<Svg.Point> area = new ArrayList<>(curve);
    area.add(new Svg.Point(left, curve.get(curve.size() - 1).y()));
    area.add(new Svg.Point(left, curve.get(0).y()));
    svg.polygon(area, new Svg.Stroke("none", 0, ""), "#e6eef5");
    svg.polyline(curve, Svg.BLUE);
  }

  private static String caption(List<EnvelopePoint> points, Print print) {
    StringBuilder out =
        new StringBuilder("Greatest values over all strength cases and directions, each by itself");
    for (Quantity q : QUANTITIES) {
      EnvelopePoint worst = points.get(0);
      for (EnvelopePoint p : points) {
        if (q.value().applyAsDouble(p) > q.value().applyAsDouble(worst)) {
          worst = p;
        }
      }
      out.append("; ").append(q.name()).append(' ');
      out.append(print.of(q.value().applyAsDouble(worst), q.unit())).append(" at ");
      out.append(print.of(worst.height_m(), Unit.M));
    }
    return out.append('.').toString();
  }
}
