package org.mastwright.report;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.mastwright.assess.Assessment;
import org.mastwright.design.Project;
import org.mastwright.units.UnitSystem;

/**
 * Everything the templates print, as text and drawings.
 *
 * @param page what stands on every page
 * @param unprintable characters of the user that the fonts lack; mostly blank
 */
public record ReportView(
    Page page,
    List<Chapters.Part> parts,
    AnswerView answer,
    List<ReviewerQuestions.Row> reviewer,
    GivenView given,
    LoadsView loads,
    MachineView machine,
    ModelView model,
    ForcesView forces,
    List<QuestionView> questions,
    DrawingsView drawings,
    ReactionsView reactions,
    List<StepView.Block> hand,
    List<ClauseRegister.Group> clauses,
    LimitsView limits,
    String unprintable) {

  /**
   * What stands on every page.
   *
   * @param sheet as a CSS page size
   * @param title of the project, as given
   * @param reference with the revision
   * @param mark of the input
   */
  public record Page(
      String sheet, String title, String reference, String mark, String version, String answer) {
    static Page of(Assessment a) {
      Project p = a.design().project();
      String revision = p.revision().isBlank() ? "" : "rev " + p.revision();
      String reference = (p.reference() + " " + revision).strip();
      return new Page(
          p.sheet() == Project.Sheet.A4 ? "A4" : "letter",
          Print.words(p.title()),
          reference,
          Print.mark(a.input().sha256()),
          a.version(),
          a.verdict().answer());
    }

    /** Width of the first page between its margins, which are narrower than those that follow. */
    public String firstWidth() {
      return sheet.equals("A4") ? "185mm" : "190.9mm";
    }

    /** What stands at the foot of every page. */
    public String foot() {
      String own =
          "input " + mark + " · mastwright " + version + " · a calculation, not an approval";
      return reference.isEmpty() ? own : reference + " · " + own;
    }
  }

  static ReportView of(Assessment a, String unprintable) {
    UnitSystem units = a.design().project().units();
    Print print = new Print(units);
    Map<String, String> titles = caseTitles(a);
    return new ReportView(
        Page.of(a),
        Chapters.of(a),
        AnswerView.of(a, print, titles),
        ReviewerQuestions.of(a),
        GivenView.of(a, print),
        LoadsView.of(a, print),
        MachineView.of(a, print),
        ModelView.of(a, print),
        ForcesView.of(a, print),
        QuestionView.of(a, print, titles),
        DrawingsView.of(a, print),
        ReactionsView.of(a),
        a.handCheck().map(d -> StepView.Block.of(d, units)).stream().toList(),
        ClauseRegister.of(a),
        LimitsView.of(a),
        unprintable.isEmpty() ? "" : codePoints(unprintable));
  }

  private static String codePoints(String characters) {
    return String.join(
        ", ",
        characters
            .codePoints()
            .limit(12)
            .mapToObj(c -> "U+" + Integer.toHexString(0x10000 + c).substring(1))
            .toList());
  }

  private static Map<String, String> caseTitles(Assessment a) {
    Map<String, String> titles = new TreeMap<>();
    a.cases().forEach(c -> titles.put(c.response().mark().id(), c.response().mark().title()));
    return titles;
  }

  /** Number and title of a chapter, blank when the report has none such. */
  public String heading(String id) {
    return parts.stream()
        .flatMap(p -> p.chapters().stream())
        .filter(c -> c.id().equals(id))
        .map(Chapters.Chapter::heading)
        .findFirst()
        .orElse("");
  }

  /** Whether the report has a chapter. */
  public boolean has(String id) {
    return !heading(id).isEmpty();
  }
}
