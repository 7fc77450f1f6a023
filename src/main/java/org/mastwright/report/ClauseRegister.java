package org.mastwright.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.CombinationSummary;
import org.mastwright.assess.RotorResult;
import org.mastwright.working.Check;
import org.mastwright.working.Clause;
import org.mastwright.working.Derivation;
import org.mastwright.working.Status;
import org.mastwright.working.Step;

/** Every source that a number of this report rests on, each once, with what it was used for. */
final class ClauseRegister {
  private static final int LONGEST_USE = 150;

  /** Clauses of one status. */
  public record Group(String status, List<Row> rows) {
    public Group {
      rows = List.copyOf(rows);
    }
  }

  /** A clause and its uses. */
  public record Row(String cite, String usedFor) {}

  private final Map<Clause, Set<String>> uses =
      new TreeMap<>(
          Comparator.comparing(Clause::document)
              .thenComparing(Clause::edition)
              .thenComparing(Clause::number)
              .thenComparing(Clause::status));

  private ClauseRegister() {}

  static List<Group> of(Assessment a) {
    ClauseRegister register = collect(a);
    return List.of(
        register.group(Status.RECALLED),
        register.group(Status.READ),
        register.group(Status.PRACTICE));
  }

  static long count(Assessment a, Status status) {
    return collect(a).uses.keySet().stream().filter(c -> c.status() == status).count();
  }

  private static ClauseRegister collect(Assessment a) {
    ClauseRegister register = new ClauseRegister();
    a.combinations().forEach(register::add);
    a.derivations().forEach(register::add);
    a.rotor().map(RotorResult::steps).ifPresent(s -> register.add(s, "the machine"));
    a.checks().forEach(register::add);
    a.handCheck().ifPresent(register::add);
    return register;
  }

  private void add(CombinationSummary c) {
    add(c.clause(), c.code());
    c.factors().forEach(f -> add(f.clause(), c.code()));
  }

  private void add(Derivation d) {
    add(d.steps(), d.heading());
  }

  private void add(Check check) {
    String id = check.subject().id();
    add(check.clause(), id);
    add(check.working(), id);
    if (check instanceof Check.Limit l) {
      add(List.of(l.demand(), l.capacity()), id);
    } else if (check instanceof Check.Interaction i) {
      add(List.of(i.sum()), id);
    } else if (check instanceof Check.Separation s) {
      add(List.of(s.required(), s.distance()), id);
    }
  }

  private void add(List<Step> steps, String use) {
    steps.forEach(s -> add(s.clause(), use));
  }

  private void add(Clause clause, String use) {
    uses.computeIfAbsent(clause, c -> new LinkedHashSet<>()).add(use);
  }

  private Group group(Status status) {
    List<Row> rows = new ArrayList<>();
    uses.forEach(
        (clause, used) -> {
          if (clause.status() == status) {
            rows.add(new Row(clause.cite(), Print.shorten(String.join(", ", used), LONGEST_USE)));
          }
        });
    return new Group(status.word(), rows);
  }
}
