package org.mastwright.report;

import java.util.List;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.EnvelopePoint;
import org.mastwright.assess.ModeResult;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;

/** Forces along the mast and how it swings. */
public record ForcesView(List<Figure> envelope, Table table, List<Figure> shapes, Table modes) {
  /** More rows than this say no more to a reader. */
  private static final int MOST_ROWS = 20;

  static ForcesView of(Assessment a, Print print) {
    return new ForcesView(
        EnvelopeFigure.of(a, print).stream().toList(),
        table(a.envelope(), print),
        ModeFigure.of(a, print).stream().toList(),
        modes(a.modes()));
  }

  private static Table table(List<EnvelopePoint> all, Print print) {
    List<EnvelopePoint> e = thinned(all);
    return Table.of("Greatest values of all strength cases, each by itself; compression positive")
        .numbers(
            print.head("height", Unit.M),
            print.column(e.stream().map(EnvelopePoint::height_m).toList(), Unit.M))
        .numbers(
            print.head("compression", Unit.KN),
            print.column(e.stream().map(EnvelopePoint::compression_N).toList(), Unit.KN))
        .numbers(
            print.head("shear", Unit.KN),
            print.column(e.stream().map(EnvelopePoint::shear_N).toList(), Unit.KN))
        .numbers(
            print.head("moment", Unit.KNM),
            print.column(e.stream().map(EnvelopePoint::moment_Nm).toList(), Unit.KNM))
        .numbers(
            print.head("torque", Unit.KNM),
            print.column(e.stream().map(EnvelopePoint::torque_Nm).toList(), Unit.KNM))
        .numbers(
            print.head("movement", Unit.MM),
            print.column(e.stream().map(EnvelopePoint::movement_m).toList(), Unit.MM))
        .build();
  }

  /** Every so manyth point with both ends and the greatest moment; the chart shows all. */
  private static List<EnvelopePoint> thinned(List<EnvelopePoint> all) {
    int every = 1 + all.size() / MOST_ROWS;
    int worst = 0;
    for (int i = 0; i < all.size(); i++) {
      if (all.get(i).moment_Nm() > all.get(worst).moment_Nm()) {
        worst = i;
      }
    }
    int atWorst = worst;
    return java.util.stream.IntStream.range(0, all.size())
        .filter(i -> i % every == 0 || i == all.size() - 1 || i == atWorst)
        .mapToObj(all::get)
        .toList();
  }

  private static Table modes(List<ModeResult> modes) {
    return Table.of("Natural frequencies")
        .words("state", modes.stream().map(ModeResult::state).toList())
        .numbers("no.", modes.stream().map(m -> String.valueOf(m.number())).toList())
        .numbers(
            "frequency, Hz", modes.stream().map(m -> Numbers.fixed(m.frequency_Hz(), 3)).toList())
        .words("direction", modes.stream().map(ModeResult::direction).toList())
        .words("shape", modes.stream().map(ModeResult::description).toList())
        .numbers(
            "hub takes part",
            modes.stream().map(m -> Numbers.fixed(m.hubParticipationRatio(), 2)).toList())
        .build();
  }
}
