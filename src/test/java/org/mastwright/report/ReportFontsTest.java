package org.mastwright.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class ReportFontsTest {
  @Test
  void latinGreekAndSignsArePrintable() {
    assertEquals("", ReportFonts.unsupported("Ärger, œuvre, Łódź, γ_M ≤ √χ² − 10⁻³ · ½ → □ … – °"));
  }

  @Test
  void whatIsTakenForPrintableHasAGlyph() {
    ReportFonts.SURELY_PRINTABLE
        .codePoints()
        .forEach(c -> assertTrue(ReportFonts.isCovered(c), Character.getName(c)));
    for (int c = 0xA0; c <= 0x17F; c++) {
      assertTrue(ReportFonts.isCovered(c), Character.getName(c));
    }
  }

  @Test
  void otherScriptsAndControlCharactersAreNot() {
    assertEquals("中\u0007\ud83d\ude00", ReportFonts.unsupported("a中b\u0007c\ud83d\ude00d中"));
    assertEquals("a□b□c□d", ReportFonts.replaceUnsupported("a中b\u0007c\ud83d\ude00d"));
  }

  @Test
  void whatIsPrintableStaysAsItIs() {
    assertEquals("Mast 7\n", ReportFonts.replaceUnsupported("Mast 7\n"));
  }
}
