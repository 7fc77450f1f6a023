package org.mastwright.report;

import com.openhtmltopdf.outputdevice.helper.ExternalResourceControlPriority;
import com.openhtmltopdf.pdfboxout.PdfBoxRenderer;
import com.openhtmltopdf.pdfboxout.PdfRendererBuilder;
import com.openhtmltopdf.pdfboxout.PdfRendererBuilder.PdfAConformance;
import com.openhtmltopdf.svgsupport.BatikSVGDrawer;
import com.openhtmltopdf.util.Diagnostic;
import com.openhtmltopdf.util.XRLog;
import java.awt.color.ColorSpace;
import java.awt.color.ICC_Profile;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Calendar;
import java.util.GregorianCalendar;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.logging.Level;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.common.PDMetadata;

/**
 * XHTML to PDF/A-2a and PDF/UA-1. Any warning of the engine is an error, nothing outside the
 * document is ever fetched, and dates and identifiers do not depend on the run.
 */
final class PdfPrinter {
  private static final DateTimeFormatter XMP_DATE =
      DateTimeFormatter.ofPattern("uuuu-MM-dd'T00:00:00+00:00'", Locale.ROOT);

  private PdfPrinter() {}

  /**
   * Prints one document.
   *
   * @throws ReportException naming the warnings, when there are any
   */
  static byte[] print(String xhtml, DocumentMark mark) {
    List<String> warnings = new CopyOnWriteArrayList<>();
    XRLog.setLoggerImpl(SilentLog.INSTANCE);
    try (BatikSVGDrawer drawings = new BatikSVGDrawer();
        PdfBoxRenderer renderer = builder(xhtml, mark, drawings, warnings).buildPdfRenderer()) {
      renderer.createPDFWithoutClosing();
      refuse(warnings);
      PDDocument document = renderer.getPdfDocument();
      settle(document, mark);
      ByteArrayOutputStream out = new ByteArrayOutputStream();
      document.save(out);
      if (MissingGlyphs.in(document)) {
        warnings.add("a character has no glyph in the typefaces of its place");
      }
      refuse(warnings);
      return out.toByteArray();
    } catch (IOException e) {
      throw new ReportException("the PDF could not be made: " + e.getMessage(), e);
    } catch (ReportException e) {
      throw e;
    } catch (RuntimeException e) {
      throw new ReportException(
          "the PDF could not be made: " + e.getMessage() + warningText(warnings), e);
    }
  }

  private static PdfRendererBuilder builder(
      String xhtml, DocumentMark mark, BatikSVGDrawer drawings, List<String> warnings) {
    PdfRendererBuilder builder = new PdfRendererBuilder();
    builder.withDiagnosticConsumer(d -> note(d, warnings));
    builder.useFastMode();
    builder.withProducer(mark.producer());
    builder.usePdfAConformance(PdfAConformance.PDFA_2_A);
    builder.usePdfUaAccessibility(true);
    builder.useColorProfile(ICC_Profile.getInstance(ColorSpace.CS_sRGB).getData());
    builder.useSVGDrawer(drawings);
    builder.useReplacementText(String.valueOf(ReportFonts.ENGINE_REPLACEMENT));
    refuseOutside(builder, warnings);
    ReportFonts.register(builder);
    builder.withHtmlContent(xhtml, null);
    builder.toStream(new ByteArrayOutputStream());
    return builder;
  }

  /** The document holds everything it needs: whatever else it asks for is refused and named. */
  private static void refuseOutside(PdfRendererBuilder builder, List<String> warnings) {
    builder.useUriResolver((base, uri) -> uri != null && uri.startsWith("#") ? uri : null);
    builder.useExternalResourceAccessControl(
        (uri, type) -> {
          warnings.add("the document asks for " + uri);
          return false;
        },
        ExternalResourceControlPriority.RUN_BEFORE_RESOLVING_URI);
  }

  private static void note(Diagnostic diagnostic, List<String> warnings) {
    if (diagnostic.getLevel().intValue() >= Level.WARNING.intValue()) {
      String cause = diagnostic.hasError() ? " – " + diagnostic.getError().getMessage() : "";
      warnings.add(diagnostic.getFormattedMessage() + cause);
    }
  }

  private static void refuse(List<String> warnings) {
    if (!warnings.isEmpty()) {
      throw new ReportException("the PDF engine warns" + warningText(warnings));
    }
  }

  private static String warningText(List<String> warnings) {
    return warnings.isEmpty()
        ? ""
        : ": " + String.join("; ", warnings.stream().distinct().toList());
  }

  private static void settle(PDDocument document, DocumentMark mark) throws IOException {
    document.setDocumentId(mark.id());
    Optional<Calendar> date = mark.date().map(PdfPrinter::midnight);
    document.getDocumentInformation().setCreationDate(date.orElse(null));
    document.getDocumentInformation().setModificationDate(date.orElse(null));
    PDMetadata metadata = document.getDocumentCatalog().getMetadata();
    String xmp = new String(metadata.toByteArray(), StandardCharsets.UTF_8);
    String dated = mark.date().map(d -> dated(xmp, d)).orElseGet(() -> undated(xmp));
    metadata.importXMPMetadata(dated.getBytes(StandardCharsets.UTF_8));
  }

  private static Calendar midnight(LocalDate date) {
    return GregorianCalendar.from(date.atStartOfDay(ZoneOffset.UTC));
  }

  private static String dated(String xmp, LocalDate date) {
    String element = "<xmp:$1Date>" + XMP_DATE.format(date) + "</xmp:$1Date>";
    String created = xmp.replaceAll("<xmp:(Create|Modify)Date>[^<]*</xmp:\\1Date>", element);
    return created.contains("<xmp:ModifyDate>")
        ? created
        : created.replaceFirst(
            "(<xmp:CreateDate>([^<]*)</xmp:CreateDate>)", "$1<xmp:ModifyDate>$2</xmp:ModifyDate>");
  }

  private static String undated(String xmp) {
    return xmp.replaceAll("\\s*<xmp:(Create|Modify)Date>[^<]*</xmp:\\1Date>", "");
  }
}
