package org.mastwright.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.Verdict;
import org.mastwright.design.Project;
import org.mastwright.units.UnitSystem;
import org.mastwright.working.Check;
import org.verapdf.pdfa.flavours.PDFAFlavour;

/** The printed report, read back. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class ReportWriterTest {
  private static final Pattern WORD_NOT_SAID = Pattern.compile("(?i)\\bsafe\\b");

  /** The kinds of report that must all come out right. */
  enum Sample {
    GUYED_FAILS {
      @Override
      Assessment assessment() {
        return SampleAssessments.of(
            SampleDesigns.guyed(
                SampleDesigns.project(
                    "Gravel bench #2 tilt-up", Project.Sheet.LETTER, UnitSystem.BOTH)),
            Verdict.FAIL);
      }
    },
    POLE_INCOMPLETE {
      @Override
      Assessment assessment() {
        return SampleAssessments.of(
            SampleDesigns.pole(
                SampleDesigns.project(
                    "Überprüfung des Werkstattmasts: Ω & <Öl>", Project.Sheet.A4, UnitSystem.SI)),
            Verdict.INCOMPLETE);
      }
    },
    GUYED_PASSES {
      @Override
      Assessment assessment() {
        return SampleAssessments.of(
            SampleDesigns.guyed(
                SampleDesigns.project("Courtyard", Project.Sheet.A4, UnitSystem.US)),
            Verdict.PASS);
      }
    },
    CROWDED {
      @Override
      Assessment assessment() {
        return OddAssessments.crowded();
      }
    },
    BARE {
      @Override
      Assessment assessment() {
        return OddAssessments.bare();
      }
    };

    abstract Assessment assessment();
  }

  private final Map<Sample, byte[]> printed = new EnumMap<>(Sample.class);

  @BeforeAll
  void printAll() {
    for (Sample sample : Sample.values()) {
      printed.put(sample, PdfReading.print(sample.assessment()));
    }
  }

  @ParameterizedTest
  @EnumSource
  void conformsToTheArchiveProfile(Sample sample) throws Exception {
    assertEquals(List.of(), PdfReading.faults(printed.get(sample), PDFAFlavour.PDFA_2_A));
  }

  @ParameterizedTest
  @EnumSource
  void conformsToTheAccessibilityProfile(Sample sample) throws Exception {
    assertEquals(List.of(), PdfReading.faults(printed.get(sample), PDFAFlavour.PDFUA_1));
  }

  @ParameterizedTest
  @EnumSource
  void samePrintTwiceIsTheSameBytes(Sample sample) {
    assertArrayEquals(printed.get(sample), PdfReading.print(sample.assessment()));
  }

  @ParameterizedTest
  @EnumSource
  void holdsEveryCheckWithItsAnswer(Sample sample) throws Exception {
    String text = String.join(" ", PdfReading.pages(printed.get(sample)));
    for (Check check : sample.assessment().checks()) {
      assertTrue(text.contains(check.subject().id()), check.subject().id());
      String badge = CheckView.of(check, Map.of(), UnitSystem.SI).badge().replaceAll(" +", " ");
      assertTrue(text.contains(badge), check.subject().id() + ": " + badge);
    }
  }

  @ParameterizedTest
  @EnumSource
  void pageOneHoldsAnswerCautionsAndTheEngineersLine(Sample sample) throws Exception {
    List<String> pages = PdfReading.pages(printed.get(sample));
    String one = pages.get(0);
    assertTrue(one.contains(sample.assessment().verdict().answer()), one);
    assertTrue(one.contains("A calculation, not an approval."), one);
    assertTrue(one.contains("Local codes and the authority decide."), one);
    assertTrue(one.contains("licensed engineer reviews and seals"), one);
    assertTrue(
        one.contains("work at height, lifting, overhead power lines, lightning and moving blades"),
        one);
    assertTrue(one.contains("out of the fall circle"), one);
    assertTrue(one.contains("Not looked at:"), one);
    assertTrue(one.contains("Responsible engineer: name"), one);
    assertTrue(one.contains("input a41f 09c2 d5e6 b788"), one);
    assertTrue(pages.get(1).contains("Contents"), pages.get(1));
    assertTrue(pages.get(1).contains("What was not looked at?"), pages.get(1));
  }

  @ParameterizedTest
  @EnumSource
  void everyPageIsMarkedAndNumbered(Sample sample) throws Exception {
    List<String> pages = PdfReading.pages(printed.get(sample));
    assertTrue(pages.size() >= 12 || sample == Sample.BARE, pages.size() + " pages");
    for (int i = 0; i < pages.size(); i++) {
      assertTrue(pages.get(i).contains("page " + (i + 1) + " of " + pages.size()), pages.get(i));
      assertTrue(pages.get(i).contains("a41f 09c2 d5e6 b788"), pages.get(i));
      assertTrue(pages.get(i).length() > 250, "page " + (i + 1) + " is all but empty");
    }
  }

  @ParameterizedTest
  @EnumSource
  void neverCallsATowerWhatNoCalculationCan(Sample sample) throws Exception {
    String text = String.join(" ", PdfReading.pages(printed.get(sample)));
    assertFalse(WORD_NOT_SAID.matcher(text).find());
  }

  @Test
  void everySheetHasTheSizeAskedFor() throws Exception {
    try (PDDocument letter = Loader.loadPDF(printed.get(Sample.GUYED_FAILS));
        PDDocument a4 = Loader.loadPDF(printed.get(Sample.POLE_INCOMPLETE))) {
      letter
          .getPages()
          .forEach(
              p -> {
                assertEquals(PDRectangle.LETTER.getWidth(), p.getMediaBox().getWidth(), 0.5);
                assertEquals(PDRectangle.LETTER.getHeight(), p.getMediaBox().getHeight(), 0.5);
              });
      a4.getPages()
          .forEach(
              p -> {
                assertEquals(PDRectangle.A4.getWidth(), p.getMediaBox().getWidth(), 0.5);
                assertEquals(PDRectangle.A4.getHeight(), p.getMediaBox().getHeight(), 0.5);
              });
    }
  }

  @Test
  void hasBookmarksAndTheProjectsDate() throws Exception {
    try (PDDocument document = Loader.loadPDF(printed.get(Sample.GUYED_FAILS))) {
      assertEquals(
          "Answer", document.getDocumentCatalog().getDocumentOutline().getFirstChild().getTitle());
      assertEquals(
          java.time.Instant.parse("2031-05-04T00:00:00Z"),
          document.getDocumentInformation().getCreationDate().toInstant());
    }
  }

  @Test
  void withoutADateTheDocumentHasNone() throws Exception {
    try (PDDocument document = Loader.loadPDF(printed.get(Sample.BARE))) {
      assertEquals(null, document.getDocumentInformation().getCreationDate());
    }
  }

  @Test
  void printsMetricAndAmericanReactionsWhateverTheUnits() throws Exception {
    String text = String.join(" ", PdfReading.pages(printed.get(Sample.POLE_INCOMPLETE)));
    assertTrue(text.contains("Foot, factored, SI units"));
    assertTrue(text.contains("Foot, factored, US units"));
    assertTrue(text.contains("up, kip"));
  }

  @Test
  void showsACharacterThatTheFontsLackAsABoxAndSaysSo() throws Exception {
    Assessment strange =
        SampleAssessments.of(
            SampleDesigns.guyed(
                SampleDesigns.project("Mast \u4e2d 7", Project.Sheet.A4, UnitSystem.SI)),
            Verdict.PASS);
    String text = String.join(" ", PdfReading.pages(PdfReading.print(strange)));
    assertTrue(text.contains("Mast □ 7"));
    assertTrue(text.contains("U+4e2d"));
  }

  @Test
  void ownTemplateStandsBeforeTheBuiltInOne(@TempDir Path folder) throws Exception {
    Files.writeString(
        folder.resolve("report.html"),
        "<html xmlns:th=\"http://www.thymeleaf.org\"><body th:text=\"${r.page().title()}\"/></html>");
    String html =
        ReportWriter.html(Sample.GUYED_PASSES.assessment(), new Options(Optional.of(folder)));
    assertTrue(html.contains("<body>Courtyard</body>"), html);
  }

  @Test
  void aFaultyTemplateIsNamedAndNothingIsWritten(@TempDir Path folder) throws Exception {
    Files.writeString(
        folder.resolve("answer.html"),
        "<html xmlns:th=\"http://www.thymeleaf.org\"><body><p th:fragment=\"answer\""
            + " th:text=\"${r.nothing()}\">a</p></body></html>");
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    Assessment assessment = Sample.GUYED_PASSES.assessment();
    Options options = new Options(Optional.of(folder));
    ReportException e =
        assertThrows(ReportException.class, () -> ReportWriter.write(assessment, out, options));
    assertTrue(e.getMessage().contains("answer"), e.getMessage());
    assertEquals(0, out.size());
  }

  @Test
  void aMissingTemplateFolderIsNamed(@TempDir Path folder) {
    Options options = new Options(Optional.of(folder.resolve("none")));
    Assessment assessment = Sample.GUYED_PASSES.assessment();
    assertThrows(ReportException.class, () -> ReportWriter.html(assessment, options));
  }
}
