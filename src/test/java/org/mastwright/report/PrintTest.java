package org.mastwright.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.mastwright.units.Unit;
import org.mastwright.units.UnitSystem;

class PrintTest {
  private static final Print SI = new Print(UnitSystem.SI);
  private static final Print BOTH = new Print(UnitSystem.BOTH);
  private static final Print US = new Print(UnitSystem.US);

  @Test
  void columnsShareTheirDecimals() {
    assertEquals(
        List.of("12.3", "0.5", "−1.0"), SI.column(List.of(12345.0, 500.0, -1000.0), Unit.KN));
    assertEquals(List.of("0", "0"), SI.column(List.of(0.0, 0.0), Unit.KN));
    assertEquals(List.of("0", "0"), SI.column(List.of(3e-9, -2e-9), Unit.M));
    assertEquals(List.of("0.000300"), SI.column(List.of(3e-4), Unit.M));
    assertEquals(List.of("1234", "5"), SI.column(List.of(1234.4, 5.0), Unit.M));
  }

  @Test
  void bothUnitsStandInOneCellAndInTheHead() {
    assertEquals(List.of("1.00 (3.28)", "0.50 (1.64)"), BOTH.column(List.of(1.0, 0.5), Unit.M));
    assertEquals("height, m (ft)", BOTH.head("height", Unit.M));
    assertEquals("height, ft", US.head("height", Unit.M));
    assertEquals("frequency, Hz", BOTH.head("frequency", Unit.HZ));
  }

  @Test
  void whatIsMissingIsSaidToBe() {
    assertEquals("not given", SI.of(OptionalDouble.empty(), Unit.M));
    assertEquals("not given", Print.words(" "));
  }

  @Test
  void unitWordsBecomeSigns() {
    assertEquals("12.9 °C (55.1 °F)", BOTH.of(286, Unit.DEGC));
    assertEquals("10.0°", SI.of(Math.toRadians(9.999), Unit.DEG));
    assertEquals("guy at 191°, 5 degrees", Print.symbols("guy at 191 deg, 5 degrees"));
    assertEquals("temperature, °C", SI.head("temperature", Unit.DEGC));
    assertEquals("180°", Print.bearing(Math.PI));
    assertEquals("22.5°", Print.bearing(Math.PI / 8));
  }

  @Test
  void marksAndTitlesAreCutWhereTheyMustBe() {
    assertEquals("a41f 09c2 d5e6 b788", Print.mark("a41f09c2d5e6b7880102030405060708"));
    assertEquals("abc…", Print.shorten("abcdef", 4));
    assertEquals("abcd", Print.shorten("abcd", 4));
  }

  @Test
  void aTableRefusesARaggedRow() {
    Table.Builder ragged =
        Table.of("t").words("a", List.of("1", "2")).words("b", List.of("1", "2"));
    assertEquals(2, ragged.build().rows().size());
    List<Table.Head> heads = List.of(new Table.Head("a", "words"));
    List<Table.Row> rows = List.of(new Table.Row(List.of(), ""));
    assertThrows(IllegalArgumentException.class, () -> new Table("t", heads, rows));
  }
}
