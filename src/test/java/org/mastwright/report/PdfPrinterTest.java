package org.mastwright.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** Whatever the PDF engine warns of stops the report. */
class PdfPrinterTest {
  private static final String ALT = " alt=\"a\" ";

  private static String page(String body) {
    return "<html lang=\"en\"><head><title>a</title><meta name=\"subject\" content=\"a\"/>"
        + "<style>body { font-family: 'Noto Sans' } @page { size: A4 }</style></head><body><h1>a"
        + "</h1>"
        + body
        + "</body></html>";
  }

  private static ReportException refused(String body) {
    String page = page(body);
    return assertThrows(ReportException.class, () -> PdfPrinter.print(page, DocumentMark.NONE));
  }

  @Test
  void aSoundPageIsPrinted() {
    byte[] pdf = PdfPrinter.print(page("<p>b</p>"), DocumentMark.NONE);
    assertEquals("%PDF", new String(pdf, 0, 4, java.nio.charset.StandardCharsets.US_ASCII));
  }

  @Test
  void aMissingGlyphIsRefused() {
    assertTrue(refused("<p>\u4e2d</p>").getMessage().contains("warns"));
  }

  @Test
  void aBrokenDrawingIsRefused() {
    refused("<svg xmlns=\"http://www.w3.org/2000/svg\"" + ALT + "><line x1=\"none\"/></svg>");
  }

  @Test
  void aDrawingWithoutWordsIsRefused() {
    refused(
        "<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"9\" height=\"9\">"
            + "<circle cx=\"3\" cy=\"3\" r=\"2\"/></svg>");
  }

  @Test
  void nothingOutsideTheDocumentIsFetched() {
    refused("<img" + ALT + "src=\"file:///etc/hostname\"/>");
    refused("<img" + ALT + "src=\"http://127.0.0.1:1/a.png\"/>");
  }

  @Test
  void malformedMarkupIsRefused() {
    refused("<p>a<b></p>");
  }

  @Test
  void anUnknownStyleIsRefused() {
    refused("<p style=\"colour: red\">a</p>");
  }

  @Test
  void theWarmUpPageIsSound() {
    ReportWriter.warmUp();
    assertTrue(PdfPrinter.print(Templates.warmUpPage(), DocumentMark.NONE).length > 1000);
  }
}
