package org.mastwright.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.mastwright.assess.Assessment;

/** No drawing runs off its paper, and every one has words. */
class DrawingsTest {
  private static final Pattern DRAWING = Pattern.compile("<svg.*?</svg>", Pattern.DOTALL);
  private static final Pattern BOX = Pattern.compile("viewBox=\"0 0 (\\S+) ([^\"]+)\"");
  private static final Pattern ACROSS = Pattern.compile("[ <](?:x|x1|x2|cx)=\"([^\"]+)\"");
  private static final Pattern UP = Pattern.compile("[ <](?:y|y1|y2|cy)=\"([^\"]+)\"");
  private static final Pattern POINTS = Pattern.compile("points=\"([^\"]+)\"");
  private static final Pattern RECT =
      Pattern.compile("<rect x=\"([^\"]+)\" y=\"([^\"]+)\" width=\"([^\"]+)\" height=\"([^\"]+)\"");
  private static final Pattern ELLIPSE =
      Pattern.compile("<ellipse cx=\"([^\"]+)\" cy=\"([^\"]+)\" rx=\"([^\"]+)\" ry=\"([^\"]+)\"");
  private static final Pattern TEXT =
      Pattern.compile(
          "<text x=\"([^\"]+)\"[^>]*font-size=\"([^\"]+)\" text-anchor=\"(\\w+)\"[^>]*?>([^<]*)<");

  /** Mean width of a letter of Noto Sans over its size, somewhat generous. */
  private static final double LETTER_WIDTH_RATIO = 0.56;

  private record Box(double width, double height) {}

  @ParameterizedTest
  @EnumSource(ReportWriterTest.Sample.class)
  void everyLineStaysOnThePaper(ReportWriterTest.Sample sample) {
    for (String svg : drawings(sample.assessment())) {
      Box box = box(svg);
      List<Double> across = numbers(ACROSS, svg);
      List<Double> up = numbers(UP, svg);
      for (MatchedPoints p : points(svg)) {
        across.add(p.x());
        up.add(p.y());
      }
      extents(RECT, svg, 0, across, up);
      extents(ELLIPSE, svg, -1, across, up);
      across.forEach(x -> assertTrue(x >= 0 && x <= box.width(), x + " of " + box + words(svg)));
      up.forEach(y -> assertTrue(y >= 0 && y <= box.height(), y + " of " + box + words(svg)));
    }
  }

  @ParameterizedTest
  @EnumSource(ReportWriterTest.Sample.class)
  void everyWordStaysOnThePaper(ReportWriterTest.Sample sample) {
    for (String svg : drawings(sample.assessment())) {
      Box box = box(svg);
      Matcher text = TEXT.matcher(svg.replaceAll("<text[^>]*rotate[^>]*>[^<]*</text>", ""));
      while (text.find()) {
        double at = Double.parseDouble(text.group(1));
        double length =
            Double.parseDouble(text.group(2)) * LETTER_WIDTH_RATIO * text.group(4).length();
        double from =
            switch (text.group(3)) {
              case "start" -> at;
              case "end" -> at - length;
              default -> at - length / 2;
            };
        assertTrue(from >= -0.5 && from + length <= box.width() + 0.5, text.group(4) + words(svg));
      }
    }
  }

  @ParameterizedTest
  @EnumSource(ReportWriterTest.Sample.class)
  void everyDrawingHasWords(ReportWriterTest.Sample sample) {
    List<String> drawings = drawings(sample.assessment());
    long withWords = drawings.stream().filter(s -> words(s).length() > 40).count();
    assertEquals(drawings.size(), withWords);
    assertTrue(drawings.size() >= 3);
  }

  private static List<String> drawings(Assessment assessment) {
    Matcher m = DRAWING.matcher(ReportWriter.html(assessment, Options.BUILT_IN));
    List<String> drawings = new ArrayList<>();
    while (m.find()) {
      drawings.add(m.group());
    }
    return drawings;
  }

  private static Box box(String svg) {
    Matcher m = BOX.matcher(svg);
    assertTrue(m.find());
    return new Box(Double.parseDouble(m.group(1)), Double.parseDouble(m.group(2)));
  }

  private static String words(String svg) {
    Matcher m = Pattern.compile("alt=\"([^\"]*)\"").matcher(svg);
    return m.find() ? ": " + m.group(1) : "";
  }

  private static List<Double> numbers(Pattern pattern, String svg) {
    List<Double> numbers = new ArrayList<>();
    Matcher m = pattern.matcher(svg);
    while (m.find()) {
      numbers.add(Double.parseDouble(m.group(1)));
    }
    return numbers;
  }

  private record MatchedPoints(double x, double y) {}

  private static List<MatchedPoints> points(String svg) {
    List<MatchedPoints> all = new ArrayList<>();
    Matcher m = POINTS.matcher(svg);
    while (m.find()) {
      for (String pair : m.group(1).strip().split(" ")) {
        String[] xy = pair.split(",");
        all.add(new MatchedPoints(Double.parseDouble(xy[0]), Double.parseDouble(xy[1])));
      }
    }
    return all;
  }

  /** Adds the far edges of rectangles ({@code near} 0) or both edges of ellipses (−1). */
  private static void extents(
      Pattern pattern, String svg, int near, List<Double> across, List<Double> up) {
    Matcher m = pattern.matcher(svg);
    while (m.find()) {
      double x = Double.parseDouble(m.group(1));
      double y = Double.parseDouble(m.group(2));
      double w = Double.parseDouble(m.group(3));
      double h = Double.parseDouble(m.group(4));
      across.addAll(List.of(x + near * w, x + w));
      up.addAll(List.of(y + near * h, y + h));
    }
  }
}
