package org.mastwright.report;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.mastwright.assess.Assessment;
import org.verapdf.core.VeraPDFException;
import org.verapdf.gf.foundry.VeraGreenfieldFoundryProvider;
import org.verapdf.pdfa.Foundries;
import org.verapdf.pdfa.PDFAParser;
import org.verapdf.pdfa.PDFAValidator;
import org.verapdf.pdfa.flavours.PDFAFlavour;
import org.verapdf.pdfa.results.TestAssertion;
import org.verapdf.pdfa.results.ValidationResult;

/** Prints assessments and reads them back. */
final class PdfReading {
  private PdfReading() {}

  static byte[] print(Assessment assessment) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try {
      ReportWriter.write(assessment, out, Options.BUILT_IN);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return out.toByteArray();
  }

  /** The text of each page, its spaces and line ends made one space. */
  static List<String> pages(byte[] pdf) throws IOException {
    try (PDDocument document = Loader.loadPDF(pdf)) {
      List<String> pages = new ArrayList<>();
      for (int i = 1; i <= document.getNumberOfPages(); i++) {
        PDFTextStripper stripper = new PDFTextStripper();
        stripper.setStartPage(i);
        stripper.setEndPage(i);
        pages.add(stripper.getText(document).replaceAll("\\s+", " "));
      }
      return pages;
    }
  }

  /** What a profile finds fault with; empty when the file conforms. */
  static List<String> faults(byte[] pdf, PDFAFlavour flavour) throws VeraPDFException, IOException {
    VeraGreenfieldFoundryProvider.initialise();
    try (PDFAParser parser =
            Foundries.defaultInstance().createParser(new ByteArrayInputStream(pdf), flavour);
        PDFAValidator validator = Foundries.defaultInstance().createValidator(flavour, false)) {
      ValidationResult result = validator.validate(parser);
      List<String> faults = new ArrayList<>();
      for (TestAssertion assertion : result.getTestAssertions()) {
        if (assertion.getStatus() == TestAssertion.Status.FAILED) {
          faults.add(
              assertion.getRuleId().getClause()
                  + " "
                  + assertion.getMessage()
                  + " at "
                  + assertion.getLocation().getContext());
        }
      }
      if (faults.isEmpty() && !result.isCompliant()) {
        faults.add("not compliant");
      }
      return faults.stream().distinct().toList();
    }
  }
}
