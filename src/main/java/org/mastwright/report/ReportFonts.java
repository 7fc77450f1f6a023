package org.mastwright.report;

import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FSFontUseCase;
import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FontStyle;
import com.openhtmltopdf.pdfboxout.PdfRendererBuilder;
import java.io.IOException;
import java.io.InputStream;
import java.util.BitSet;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import org.apache.fontbox.ttf.CmapLookup;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;

/**
 * The typefaces of the report: Latin, Greek, mathematical letters and symbols. A character that
 * they lack is printed as {@code □}.
 */
public final class ReportFonts {
  /** Stands for a character that cannot be printed. */
  public static final char REPLACEMENT = '□';

  /**
   * What the PDF engine is told to print for a glyph it does not find, since it does so without a
   * warning. The printer looks for it in the finished file; from a user it counts as not printable.
   */
  static final char ENGINE_REPLACEMENT = '\u02DB';

  private static final String FOLDER = "/org/mastwright/fonts/";

  /** Up to here (Latin Extended-A but for its gaps) every text face has every character. */
  private static final int SURELY_PRINTABLE_TO = 0x17F;

  /** Others that every report uses: known without reading the faces, and tested against them. */
  static final String SURELY_PRINTABLE =
      "ΑΒΓΔΕΖΗΘΙΚΛΜΝΞΟΠΡΣΤΥΦΧΨΩαβγδεζηθικλμνξοπρςστυφχψω"
          + "–—‘’“”…−·√≤≥≈≠∞∑→↑↓∅□⁰⁴⁵⁶⁷⁸⁹⁻⁺₀₁₂₃₄₅₆₇₈₉₍₎€";

  private record Face(String file, String family, int weight, FontStyle style) {}

  private static final List<Face> FACES =
      List.of(
          new Face("NotoSans-Regular", "Noto Sans", 400, FontStyle.NORMAL),
          new Face("NotoSans-Bold", "Noto Sans", 700, FontStyle.NORMAL),
          new Face("NotoSans-Italic", "Noto Sans", 400, FontStyle.ITALIC),
          new Face("NotoSerif-Italic", "Noto Serif", 400, FontStyle.ITALIC),
          new Face("NotoSansMono-Regular", "Noto Sans Mono", 400, FontStyle.NORMAL),
          new Face("NotoSansMath-Regular", "Noto Sans Math", 400, FontStyle.NORMAL));

  /** Text faces fall back on these. */
  private static final List<String> FALLBACKS =
      List.of("NotoSansMath-Regular", "NotoSansMono-Regular");

  private static final Set<FSFontUseCase> USES =
      EnumSet.of(FSFontUseCase.DOCUMENT, FSFontUseCase.SVG);

  private ReportFonts() {}

  /** Makes the faces known to the PDF engine, for text and for drawings, each subset when used. */
  static void register(PdfRendererBuilder builder) {
    for (Face face : FACES) {
      builder.useFont(
          () -> open(face.file()), face.family(), face.weight(), face.style(), true, USES);
    }
  }

  private static InputStream open(String file) {
    InputStream in = ReportFonts.class.getResourceAsStream(FOLDER + file + ".ttf");
    if (in == null) {
      throw new ReportException("font " + file + " is missing from the program");
    }
    return in;
  }

  /** The characters of a text that no face can print, each once, in order; mostly empty. */
  public static String unsupported(String text) {
    StringBuilder missing = new StringBuilder();
    text.codePoints()
        .filter(c -> !isPrintable(c))
        .distinct()
        .forEach(c -> missing.appendCodePoint(c));
    return missing.toString();
  }

  /** The text with {@link #REPLACEMENT} for every character that no face can print. */
  public static String replaceUnsupported(String text) {
    StringBuilder out = new StringBuilder(text.length());
    text.codePoints().forEach(c -> out.appendCodePoint(isPrintable(c) ? c : REPLACEMENT));
    return out.toString();
  }

  private static boolean isPrintable(int codePoint) {
    if (codePoint == '\n' || codePoint == '\t' || codePoint == '\r') {
      return true;
    }
    if (codePoint == ENGINE_REPLACEMENT
        || codePoint < 0x20
        || codePoint >= 0x7F && codePoint < 0xA0) {
      return false;
    }
    return codePoint <= SURELY_PRINTABLE_TO
        || SURELY_PRINTABLE.indexOf(codePoint) >= 0
        || isCovered(codePoint);
  }

  /** Whether a face has the character, from the faces themselves. */
  static boolean isCovered(int codePoint) {
    return Coverage.ALL.contains(codePoint);
  }

  /** Read only when a character outside plain Latin turns up. */
  private static final class Coverage {
    static final Coverage ALL = new Coverage();

    private final BitSet characters;

    private Coverage() {
      BitSet everyTextFace = null;
      BitSet fallbacks = new BitSet();
      for (Face face : FACES) {
        BitSet own = characters(face.file());
        if (FALLBACKS.contains(face.file())) {
          fallbacks.or(own);
        } else if (everyTextFace == null) {
          everyTextFace = own;
        } else {
          everyTextFace.and(own);
        }
      }
      fallbacks.or(everyTextFace);
      characters = fallbacks;
    }

    boolean contains(int codePoint) {
      return characters.get(codePoint);
    }

    private static BitSet characters(String file) {
      try (InputStream in = open(file);
          TrueTypeFont font =
              new TTFParser().parse(RandomAccessReadBuffer.createBufferFromStream(in))) {
        CmapLookup cmap = font.getUnicodeCmapLookup();
        BitSet characters = new BitSet();
        for (int c = 0; c <= 0x1FFFF; c++) {
          if (cmap.getGlyphId(c) != 0) {
            characters.set(c);
          }
        }
        return characters;
      } catch (IOException e) {
        throw new ReportException("font " + file + " cannot be read", e);
      }
    }
  }
}
