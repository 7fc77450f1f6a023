package org.mastwright.report;

import java.util.List;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.RotorResult;
import org.mastwright.units.Unit;

/**
 * What the machine does.
 *
 * @param model how the rotor was worked out; blank without a machine
 * @param charts power and thrust over wind, when there are any points
 */
public record MachineView(
    String model, Table states, Table operation, List<Figure> charts, List<StepView> steps) {
  static MachineView of(Assessment a, Print print) {
    return a.rotor()
        .map(r -> of(r, print))
        .orElseGet(
            () ->
                new MachineView(
                    "", Table.of("").build(), Table.of("").build(), List.of(), List.of()));
  }

  private static MachineView of(RotorResult r, Print print) {
    return new MachineView(
        r.model(),
        states(r, print),
        operation(r, print),
        PowerFigure.of(r, print).stream().toList(),
        StepView.of(r.steps(), print.units()));
  }

  private static Table states(RotorResult r, Print print) {
    List<RotorResult.StateRow> s = r.states();
    return Table.of("States of the machine, without factors; the greatest thrust in bold")
        .words("state", s.stream().map(RotorResult.StateRow::state).toList())
        .numbers(
            print.head("wind", Unit.MPS),
            print.column(s.stream().map(RotorResult.StateRow::wind_mps).toList(), Unit.MPS))
        .numbers(
            "speed, rpm",
            print.column(s.stream().map(RotorResult.StateRow::speed_radps).toList(), Unit.RPM))
        .numbers(
            print.head("thrust", Unit.KN),
            print.column(s.stream().map(RotorResult.StateRow::thrust_N).toList(), Unit.KN))
        .words("how", s.stream().map(w -> w.how() + (w.greatest() ? " – greatest" : "")).toList())
        .marked(s.stream().map(RotorResult.StateRow::greatest).toList())
        .build();
  }

  private static Table operation(RotorResult r, Print print) {
    List<RotorResult.OperationPoint> p = r.operation();
    return Table.of("In operation, over wind at the hub")
        .numbers(
            print.head("wind", Unit.MPS),
            print.column(p.stream().map(RotorResult.OperationPoint::wind_mps).toList(), Unit.MPS))
        .numbers(
            "speed, rpm",
            print.column(
                p.stream().map(RotorResult.OperationPoint::speed_radps).toList(), Unit.RPM))
        .numbers(
            "power, kW",
            print.column(p.stream().map(RotorResult.OperationPoint::power_W).toList(), Unit.KW))
        .numbers(
            print.head("thrust", Unit.KN),
            print.column(p.stream().map(RotorResult.OperationPoint::thrust_N).toList(), Unit.KN))
        .numbers(
            "thrust coefficient",
            print.column(
                p.stream().map(RotorResult.OperationPoint::ctCoefficient).toList(), Unit.ONE))
        .words("state", p.stream().map(RotorResult.OperationPoint::state).toList())
        .build();
  }
}
