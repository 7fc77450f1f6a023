package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.assess.Assessment;
import org.mastwright.working.Question;

/** What a plan reviewer usually asks, each with the chapter that answers. */
final class ReviewerQuestions {
  /** A question and the id of the heading that answers it. */
  public record Row(String question, String chapter) {}

  private ReviewerQuestions() {}

  static List<Row> of(Assessment a) {
    List<Row> rows = new ArrayList<>();
    rows.add(new Row("Does it meet the checks, and which one decides?", "answer"));
    rows.add(
        new Row("What did the owner state, and what did the program take by itself?", "given"));
    rows.add(new Row("Which papers does it rest on?", "papers"));
    rows.add(new Row("Which wind: speed, averaging time, height, return period, terrain?", "wind"));
    if (a.rotor().isPresent()) {
      rows.add(new Row("Where does the rotor's thrust come from, in every state?", "machine"));
    }
    rows.add(new Row("Which load combinations and factors, and on what authority?", "cases"));
    rows.add(new Row("Does the model follow the deflected shape and guys that slacken?", "model"));
    rows.add(new Row("Was the result compared with a second method?", "model"));
    rows.add(new Row("Where along the mast are the greatest forces?", "forces"));
    for (Question q : Chapters.questions(a)) {
      rows.add(new Row(q.question(), Chapters.id(q)));
    }
    rows.add(new Row("How far does it reach if it falls?", "drawings"));
    rows.add(
        new Row(
            "What must the footing and each anchor hold, with and without factors?", "reactions"));
    if (a.handCheck().isPresent()) {
      rows.add(new Row("Can one check be followed by hand?", "hand"));
    }
    rows.add(new Row("Which clauses were quoted from memory?", "clauses"));
    rows.add(new Row("What was not looked at?", "limits"));
    return rows;
  }
}
