package org.mastwright.report;

import java.io.IOException;
import java.io.OutputStream;
import org.mastwright.assess.Assessment;

/**
 * Prints an assessment as a tagged, archivable PDF (PDF/A-2a and PDF/UA-1). The same assessment
 * gives the same bytes.
 */
public final class ReportWriter {
  private ReportWriter() {}

  /**
   * Prints the report. Nothing is written unless the whole report could be made without a warning.
   *
   * @param out receives the PDF; it is not closed
   * @throws ReportException when a template is faulty or the PDF engine warns of anything, such as
   *     a missing glyph or a broken drawing
   */
  public static void write(Assessment assessment, OutputStream out, Options options)
      throws IOException {
    out.write(PdfPrinter.print(html(assessment, options), DocumentMark.of(assessment)));
  }

  /**
   * The final XHTML, drawings included, from which the PDF is made.
   *
   * @throws ReportException when a template is faulty
   */
  public static String html(Assessment assessment, Options options) {
    Templates templates = new Templates(options);
    String plain = templates.report(ReportView.of(assessment, ""));
    String missing = ReportFonts.unsupported(plain);
    if (!missing.isEmpty()) {
      plain = ReportFonts.replaceUnsupported(templates.report(ReportView.of(assessment, missing)));
    }
    return LongWords.breakable(plain);
  }

  /**
   * Prints one small page and throws it away, so that the PDF classes and fonts are loaded while
   * something else is being worked out. Meant for a thread of its own.
   */
  public static void warmUp() {
    PdfPrinter.print(Templates.warmUpPage(), DocumentMark.NONE);
  }
}
