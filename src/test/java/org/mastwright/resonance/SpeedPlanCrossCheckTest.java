package org.mastwright.resonance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.mastwright.design.Turbine.Band;
import org.mastwright.working.Check;
import org.mastwright.working.Outcome;

/** Windows and separations against the arithmetic of a page of notes: n = 60 f / order. */
class SpeedPlanCrossCheckTest {
  private static final double RPM = Math.PI / 30;
  private static final Excitation ONCE = new Excitation(1, "once per turn", true);
  private static final Excitation BLADE = new Excitation(3, "each blade passing", true);
  private static final Excitation TWICE = new Excitation(6, "twice per blade passing", false);

  private static ModeBand mode(double least_Hz, double greatest_Hz) {
    return new ModeBand(1, "first bending", least_Hz, greatest_Hz, 1, false);
  }

  private static SpeedPlan plan(ModeBand mode, double margin, List<Excitation> excitations) {
    return SpeedPlan.of(List.of(mode), excitations, margin, 60 * RPM, 300 * RPM, false);
  }

  @Test
  void windowEdgesAreSixtyTimesTheFrequency() {
    SpeedPlan plan = plan(mode(1.10, 1.53), 0, List.of(ONCE));
    assertEquals(66.0, plan.merged().get(0).from_radps() / RPM, 1e-9);
    assertEquals(91.8, plan.merged().get(0).to_radps() / RPM, 1e-9);
  }

  @Test
  void marginWidensTheWindowOnBothSides() {
    SpeedPlan plan = plan(mode(5, 5), 0.10, List.of(BLADE));
    assertEquals(90, plan.merged().get(0).from_radps() / RPM, 1e-9);
    assertEquals(110, plan.merged().get(0).to_radps() / RPM, 1e-9);
  }

  @Test
  void clearRangesFillTheRestAndNarrowOnesAreSetAside() {
    SpeedPlan plan = plan(mode(1.10, 1.53), 0, List.of(ONCE));
    assertEquals(1, plan.clear().size());
    assertEquals(91.8, plan.clear().get(0).from_radps() / RPM, 1e-9);
    assertEquals(300, plan.clear().get(0).to_radps() / RPM, 1e-9);
    assertEquals(60, plan.tooNarrow().get(0).from_radps() / RPM, 1e-9);
  }

  @Test
  void twiceBladePassingIsShownAndDoesNotBlock() {
    SpeedPlan plan = plan(mode(12, 12), 0.10, List.of(TWICE));
    assertTrue(plan.avoid().isEmpty());
    assertEquals(108, plan.watch().get(0).from_radps() / RPM, 1e-9);
  }

  @Test
  void aModeThatDoesNotMoveTheHubNeverBlocks() {
    ModeBand still = new ModeBand(4, "span two", 2, 2, 0.049, false);
    assertTrue(plan(still, 0.10, List.of(ONCE)).avoid().isEmpty());
  }

  @Test
  void twistingBlocksOnlyUnderAnUprightRotor() {
    ModeBand twist = new ModeBand(4, "twisting", 2, 2, 1, true);
    assertTrue(plan(twist, 0.10, List.of(ONCE)).avoid().isEmpty());
    assertEquals(
        1,
        SpeedPlan.of(List.of(twist), List.of(ONCE), 0.1, 60 * RPM, 300 * RPM, true).avoid().size());
  }

  private static Check separation(ModeBand mode, double from_rpm, double to_rpm) {
    return SeparationChecks.of(
            List.of(mode),
            List.of(ONCE),
            List.of(new Band(from_rpm * RPM, to_rpm * RPM)),
            0.10,
            false,
            List.of())
        .get(0);
  }

  @Test
  void separationIsRequiredOverDistance() {
    // 2 Hz against 90 rpm = 1.5 Hz: 0.2 Hz required of 0.5 Hz
    Check check = separation(mode(2, 2.5), 60, 90);
    assertEquals(0.4, check.utilisation().orElseThrow(), 1e-12);
    assertEquals(Outcome.PASS, check.outcome());
  }

  @Test
  void justInsideTheMarginFails() {
    Check check = separation(mode(2, 2.5), 60, 108.1);
    assertEquals(Outcome.FAIL, check.outcome());
    assertTrue(check.utilisation().orElseThrow() > 1);
  }

  @Test
  void coveredFrequencyFailsWithoutAUtilisation() {
    Check check = separation(mode(2, 2.5), 60, 130);
    assertEquals(Outcome.FAIL, check.outcome());
    assertTrue(check.utilisation().isEmpty());
  }

  @Test
  void speedsThatAreSkippedDoNotCount() {
    Check check =
        SeparationChecks.of(
                List.of(mode(2, 2.5)),
                List.of(ONCE),
                List.of(new Band(60 * RPM, 90 * RPM), new Band(180 * RPM, 300 * RPM)),
                0.10,
                false,
                List.of())
            .get(0);
    // from above: 3 Hz against 2.5 Hz, 0.25 required of 0.5; from below 0.2 of 0.5
    assertEquals(Outcome.PASS, check.outcome());
    assertEquals(0.5, check.utilisation().orElseThrow(), 1e-12);
  }
}
