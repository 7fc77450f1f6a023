package org.mastwright.report;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.mastwright.assess.Assessment;
import org.mastwright.working.Question;

/** The chapters this report has, in order and numbered. */
final class Chapters {
  /**
   * A chapter.
   *
   * @param id of its heading, that links lead to
   */
  public record Chapter(int number, String id, String title) {
    /** Number and title. */
    public String heading() {
      return number + "  " + title;
    }
  }

  /** Chapters under a common heading of the table of contents. */
  public record Part(String title, List<Chapter> chapters) {
    public Part {
      chapters = List.copyOf(chapters);
    }
  }

  private final List<Part> parts = new ArrayList<>();
  private final List<Chapter> current = new ArrayList<>();
  private int number;

  private Chapters() {}

  static List<Part> of(Assessment a) {
    Chapters c = new Chapters();
    c.chapter("answer", "The answer on one page");
    c.chapter("reviewer", "What a reviewer usually asks, and where the answer stands");
    c.part("Answer");
    c.chapter("given", "What was given, what was assumed, what is missing");
    c.chapter("papers", "Papers relied on, and papers not available");
    c.chapter("wind", "Wind, ice and ground, with each conversion step");
    if (a.rotor().isPresent()) {
      c.chapter("machine", "The machine: its thrust in every state");
    }
    c.part("Given");
    c.chapter("cases", "Load cases and factors");
    c.chapter("model", "How the tower was modelled, and the proof that it balances");
    c.chapter("forces", "Forces along the mast, worst of all directions");
    if (!a.modes().isEmpty()) {
      c.chapter("modes", "How it swings: natural frequencies and shapes");
    }
    for (Question question : questions(a)) {
      c.chapter(id(question), question.heading());
    }
    c.part("Worked");
    c.chapter("drawings", "Side views and plan to scale");
    c.chapter("reactions", "What the ground must hold");
    if (a.handCheck().isPresent()) {
      c.chapter("hand", "One check by hand, from start to end");
    }
    c.chapter("clauses", "Clauses: recalled, read, practice");
    c.chapter("limits", "Limits of this calculation, and cautions");
    c.part("For the file");
    return List.copyOf(c.parts);
  }

  private void chapter(String id, String title) {
    current.add(new Chapter(++number, id, title));
  }

  private void part(String title) {
    parts.add(new Part(title, current));
    current.clear();
  }

  /** The questions that have checks, in the order of the pages. */
  static List<Question> questions(Assessment a) {
    return Arrays.stream(Question.values())
        .filter(q -> a.checks().stream().anyMatch(c -> c.subject().question() == q))
        .toList();
  }

  /** The id of a question's chapter. */
  static String id(Question question) {
    return "q-" + question.name().toLowerCase(java.util.Locale.ROOT).replace('_', '-');
  }
}
