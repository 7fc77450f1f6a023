package org.mastwright.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class ScaleTest {
  @Test
  void placesAValueBetweenItsEnds() {
    assertEquals(15, new Scale(0, 10, 10, 20).at(5), 1e-12);
    assertEquals(80, new Scale(0, 10, 100, 0).at(2), 1e-12);
    assertThrows(IllegalArgumentException.class, () -> new Scale(1, 1, 0, 10));
  }

  @Test
  void endsOnARoundValueThatHoldsTheGreatest() {
    Scale scale = Scale.fromZero(18.3, 0, 100, 8);
    assertEquals(20, scale.to(), 1e-12);
    assertEquals(List.of(0.0, 2.5, 5.0, 7.5, 10.0, 12.5, 15.0, 17.5, 20.0), scale.ticks(8));
    assertEquals(1, Scale.fromZero(0, 0, 100, 4).to(), 1e-12);
  }

  @Test
  void choosesTheLargestRatioThatFits() {
    assertEquals(400, Scale.ratio(21.9, 55.6, 20.8, 88));
    assertEquals(55, Scale.paper_mm(22, 400), 1e-12);
    int huge = Scale.ratio(40_000, 50, 10, 50);
    assertTrue(Scale.paper_mm(40_000, huge) <= 50);
  }

  @Test
  void scaleBarsAreRound() {
    assertEquals(10, Scale.roundBelow(10.9), 1e-12);
    assertEquals(5, Scale.roundBelow(9.9), 1e-12);
    assertEquals(0.2, Scale.roundBelow(0.27), 1e-12);
  }

  @Test
  void bearingsRunClockwiseFromNorth() {
    assertEquals(7, Scale.east(Math.PI / 2, 7), 1e-12);
    assertEquals(-7, Scale.north(Math.PI, 7), 1e-12);
  }
}
