package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.ModeResult;
import org.mastwright.assess.ModeResult.ShapePoint;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;

/** Shapes of the lowest natural frequencies of the first state, side by side. */
final class ModeFigure {
  private static final double WIDTH = 136;
  private static final double HEIGHT = 96;
  private static final double TOP = 12;
  private static final double FOOT = 88;
  private static final double LEFT = 14;
  private static final int MOST = 6;

  private ModeFigure() {}

  static Optional<Figure> of(Assessment a, Print print) {
    List<ModeResult> modes =
        a.modes().stream()
            .filter(m -> m.state().equals(a.modes().get(0).state()) && m.shape().size() > 1)
            .limit(MOST)
            .toList();
    if (modes.isEmpty()) {
      return Optional.empty();
    }
    Unit length = print.first(Unit.M);
    double top =
        modes.stream()
            .flatMap(m -> m.shape().stream())
            .mapToDouble(ShapePoint::height_m)
            .max()
            .orElse(1);
    Scale y = Scale.fromZero(length.fromSi(top), FOOT, TOP, 8);
    Svg svg = new Svg(WIDTH, HEIGHT);
    double panel = (WIDTH - LEFT) / MOST;
    Axes.side(svg, y, LEFT, LEFT + panel * modes.size(), 8, "height, " + length.symbol());
    for (int i = 0; i < modes.size(); i++) {
      shape(svg, modes.get(i), LEFT + i * panel, panel, y, length);
    }
    legend(svg);
    String caption = caption(modes);
    return Optional.of(new Figure(svg.end("Mode shapes over height. " + caption), caption));
  }

  private static void shape(
      Svg svg, ModeResult mode, double left, double panel, Scale y, Unit length) {
    Scale x = new Scale(-1.15, 1.15, left, left + panel);
    svg.line(x.at(0), TOP, x.at(0), FOOT, Svg.HAIR);
    draw(svg, mode, ShapePoint::twistRatio, x, y, length, Svg.GREEN);
    draw(svg, mode, ShapePoint::northRatio, x, y, length, Svg.RUST);
    draw(svg, mode, ShapePoint::eastRatio, x, y, length, Svg.BLUE);
    svg.textMiddle(x.at(0), 5, 2.6, "mode " + mode.number());
    svg.textMiddle(x.at(0), 9, 2.4, Numbers.fixed(mode.frequency_Hz(), 3) + " Hz");
  }

  private static void draw(
      Svg svg,
      ModeResult mode,
      ToDoubleFunction<ShapePoint> value,
      Scale x,
      Scale y,
      Unit length,
      Svg.Stroke stroke) {
    List<Svg.Point> points = new ArrayList<>();
    for (ShapePoint p : mode.shape()) {
      points.add(new Svg.Point(x.at(value.applyAsDouble(p)), y.at(length.fromSi(p.height_m()))));
    }
    svg.polyline(points, stroke);
  }

  private static void legend(Svg svg) {
    sample(svg, 20, "east", Svg.BLUE);
    sample(svg, 55, "north", Svg.RUST);
    sample(svg, 90, "twist", Svg.GREEN);
  }

  private static void sample(Svg svg, double x, String word, Svg.Stroke stroke) {
    svg.line(x, 93.3, x + 10, 93.3, stroke).text(x + 12, 94.2, 2.4, word);
  }

  private static String caption(List<ModeResult> modes) {
    return "Shapes in state "
        + modes.get(0).state()
        + ", greatest movement one; full line east, long dashes north, dots twist. "
        + modes.stream()
            .map(
                m ->
                    "Mode "
                        + m.number()
                        + ": "
                        + m.description()
                        + ", "
                        + Numbers.fixed(m.frequency_Hz(), 3)
                        + " Hz")
            .collect(Collectors.joining("; "))
        + ".";
  }
}
