package org.mastwright.report;

import java.io.IOException;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.Set;
import org.apache.fontbox.cmap.CMap;
import org.apache.fontbox.cmap.CMapParser;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.cos.COSStream;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;

/**
 * Finds out whether the PDF engine replaced a character it had no glyph for: the replacement then
 * stands in the table that leads from the glyphs of an embedded typeface back to characters.
 */
final class MissingGlyphs {
  private MissingGlyphs() {}

  /** Whether any typeface of a saved document was made to print the replacement. */
  static boolean in(PDDocument document) throws IOException {
    Set<COSDictionary> seen = Collections.newSetFromMap(new IdentityHashMap<>());
    for (PDPage page : document.getPages()) {
      COSDictionary fonts = page.getResources().getCOSObject().getCOSDictionary(COSName.FONT);
      if (fonts == null) {
        continue;
      }
      for (COSName name : fonts.keySet()) {
        COSDictionary font = fonts.getCOSDictionary(name);
        if (seen.add(font) && printsReplacement(font.getCOSStream(COSName.TO_UNICODE))) {
          return true;
        }
      }
    }
    return false;
  }

  private static boolean printsReplacement(COSStream toUnicode) throws IOException {
    if (toUnicode == null) {
      return false;
    }
    CMap characters =
        new CMapParser()
            .parse(
                new org.apache.pdfbox.io.RandomAccessReadBuffer(
                    toUnicode.createInputStream().readAllBytes()));
    return characters.getCodesFromUnicode(String.valueOf(ReportFonts.ENGINE_REPLACEMENT)) != null;
  }
}
