package org.mastwright.working;

import java.util.List;
import java.util.OptionalDouble;
import org.mastwright.units.Unit;

/** One question with its answer and the working that led there. */
public sealed interface Check {
  /** What it is about. */
  Subject subject();

  /** The clause that the check as a whole is made by. */
  Clause clause();

  /** Demand over capacity; empty where there is none, as in a check not assessed. */
  OptionalDouble utilisation();

  Outcome outcome();

  /** The steps, in the order of the calculation. */
  List<Step> working();

  /** Assumptions, substitutions and out-of-range use, printed beside the check. */
  List<Finding> findings();

  /** Demand against capacity in one unit: passes when demand / capacity is at most 1. */
  record Limit(
      Subject subject,
      Clause clause,
      Step demand,
      Step capacity,
      List<Step> working,
      List<Finding> findings)
      implements Check {
    public Limit {
      working = List.copyOf(working);
      findings = List.copyOf(findings);
      if (demand.unit().dimension() != capacity.unit().dimension()) {
        throw new IllegalArgumentException(subject.id() + ": demand and capacity differ in unit");
      }
      if (!(capacity.si() > 0)) {
        throw new IllegalArgumentException(subject.id() + ": capacity " + capacity.si());
      }
    }

    @Override
    public OptionalDouble utilisation() {
      return OptionalDouble.of(demand.si() / capacity.si());
    }

    @Override
    public Outcome outcome() {
      return Outcomes.ofUtilisation(demand.si() / capacity.si());
    }
  }

  /** A sum of ratios against 1; the sum is the last step of the working as well. */
  record Interaction(
      Subject subject, Clause clause, Step sum, List<Step> working, List<Finding> findings)
      implements Check {
    public Interaction {
      working = List.copyOf(working);
      findings = List.copyOf(findings);
      if (!sum.unit().equals(Unit.ONE)) {
        throw new IllegalArgumentException(subject.id() + ": an interaction has no unit");
      }
    }

    @Override
    public OptionalDouble utilisation() {
      return OptionalDouble.of(sum.si());
    }

    @Override
    public Outcome outcome() {
      return Outcomes.ofUtilisation(sum.si());
    }
  }

  /**
   * A distance that must be kept: required over distance. With a distance of zero or less it fails
   * and has no utilisation.
   */
  record Separation(
      Subject subject,
      Clause clause,
      Step required,
      Step distance,
      List<Step> working,
      List<Finding> findings)
      implements Check {
    public Separation {
      working = List.copyOf(working);
      findings = List.copyOf(findings);
      if (required.unit().dimension() != distance.unit().dimension()) {
        throw new IllegalArgumentException(subject.id() + ": the distances differ in unit");
      }
    }

    @Override
    public OptionalDouble utilisation() {
      return distance.si() > 0
          ? OptionalDouble.of(required.si() / distance.si())
          : OptionalDouble.empty();
    }

    @Override
    public Outcome outcome() {
      return distance.si() > 0
          ? Outcomes.ofUtilisation(required.si() / distance.si())
          : Outcome.FAIL;
    }
  }

  /** Something that could not be assessed, with the reason in a sentence. */
  record NotAssessed(
      Subject subject, Clause clause, String reason, List<Step> working, List<Finding> findings)
      implements Check {
    public NotAssessed {
      working = List.copyOf(working);
      findings = List.copyOf(findings);
      if (reason.isBlank()) {
        throw new IllegalArgumentException(subject.id() + " is not assessed: say why");
      }
    }

    @Override
    public OptionalDouble utilisation() {
      return OptionalDouble.empty();
    }

    @Override
    public Outcome outcome() {
      return Outcome.NOT_ASSESSED;
    }
  }
}
