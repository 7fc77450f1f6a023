package org.mastwright.report;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import org.mastwright.assess.RotorResult;
import org.mastwright.assess.RotorResult.OperationPoint;
import org.mastwright.units.Unit;

/** Power and thrust over wind, one chart above the other, so that neither borrows an axis. */
final class PowerFigure {
  private static final double WIDTH = 136;
  private static final double HEIGHT = 88;
  private static final double LEFT = 15;
  private static final double RIGHT = 130;

  private PowerFigure() {}

  static Optional<Figure> of(RotorResult r, Print print) {
    List<OperationPoint> points =
        r.operation().stream()
            .sorted(Comparator.comparingDouble(OperationPoint::wind_mps))
            .toList();
    if (points.size() < 2) {
      return Optional.empty();
    }
    Unit wind = print.first(Unit.MPS);
    Unit force = print.first(Unit.KN);
    Svg svg = new Svg(WIDTH, HEIGHT);
    double fastest = wind.fromSi(greatest(points, OperationPoint::wind_mps));
    Scale x = Scale.fromZero(fastest, LEFT, RIGHT, 8);
    Scale power =
        Scale.fromZero(Unit.KW.fromSi(greatest(points, OperationPoint::power_W)), 36, 4, 4);
    Scale thrust =
        Scale.fromZero(force.fromSi(greatest(points, OperationPoint::thrust_N)), 78, 46, 4);
    Axes.side(svg, power, LEFT, RIGHT, 4, "power, kW");
    Axes.side(svg, thrust, LEFT, RIGHT, 4, "thrust, " + force.symbol());
    Axes.foot(svg, x, 4, 78, 8, "wind at the hub, " + wind.symbol());
    curve(
        svg,
        points,
        p -> x.at(wind.fromSi(p.wind_mps())),
        p -> power.at(Unit.KW.fromSi(p.power_W())),
        Svg.BLUE);
    curve(
        svg,
        points,
        p -> x.at(wind.fromSi(p.wind_mps())),
        p -> thrust.at(force.fromSi(p.thrust_N())),
        Svg.RUST);
    return Optional.of(new Figure(svg.end(alt(points, print)), caption(points, print)));
  }

  private static void curve(
      Svg svg,
      List<OperationPoint> points,
      ToDoubleFunction<OperationPoint> x,
      ToDoubleFunction<OperationPoint> y,
      Svg.Stroke stroke) {
    svg.polyline(
        points.stream().map(p -> new Svg.Point(x.applyAsDouble(p), y.applyAsDouble(p))).toList(),
        stroke);
  }

  private static double greatest(
      List<OperationPoint> points, ToDoubleFunction<OperationPoint> value) {
    return points.stream().mapToDouble(value).max().orElse(0);
  }

  private static String caption(List<OperationPoint> points, Print print) {
    OperationPoint most =
        points.stream().max(Comparator.comparingDouble(OperationPoint::thrust_N)).orElseThrow();
    return "Power (above, full line) and thrust (below, broken line) over wind. In operation the"
        + " thrust is greatest at "
        + print.of(most.wind_mps(), Unit.MPS)
        + ": "
        + print.of(most.thrust_N(), Unit.KN)
        + "; greatest power "
        + print.of(greatest(points, OperationPoint::power_W), Unit.KW)
        + ".";
  }

  private static String alt(List<OperationPoint> points, Print print) {
    return "Two charts over wind speed: power and thrust. " + caption(points, print);
  }
}
