package org.mastwright.report;

import java.util.List;
import org.mastwright.assess.Assessment;

/** Side views and plan. */
public record DrawingsView(List<Figure> sides, Figure plan) {
  static DrawingsView of(Assessment a, Print print) {
    return new DrawingsView(SideFigure.elevations(a, print), PlanFigure.of(a, print));
  }
}
