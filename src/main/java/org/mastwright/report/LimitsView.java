package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.assess.Assessment;
import org.mastwright.working.Outcome;

/**
 * What this calculation did not look at.
 *
 * @param notChecked checks that could not be made, with the reason
 * @param raisingGiven whether a raising was described, which is read and not calculated
 */
public record LimitsView(List<String> notChecked, boolean raisingGiven, boolean guyed) {
  static LimitsView of(Assessment a) {
    List<String> open = new ArrayList<>();
    a.checks().stream()
        .filter(c -> c.outcome() == Outcome.NOT_ASSESSED)
        .forEach(c -> open.add(c.subject().title() + " (" + c.subject().where() + ")"));
    return new LimitsView(
        List.copyOf(open), a.design().raising().isPresent(), !a.design().tower().guys().isEmpty());
  }
}
