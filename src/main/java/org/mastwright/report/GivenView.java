package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.mastwright.assess.Assessment;
import org.mastwright.design.Design;
import org.mastwright.working.DefaultTaken;
import org.mastwright.working.Finding;

/**
 * What was given, what was taken instead, what is missing.
 *
 * @param groups facts as given
 * @param tables tubes, joints, guys, anchors as given
 * @param defaults every value that was not given
 * @param findings by severity, the gravest first
 * @param papers relied on
 */
public record GivenView(
    List<Fact.Group> groups,
    List<Table> tables,
    Table defaults,
    List<FindingGroup> findings,
    Table papers,
    String fileName,
    String sha256) {

  /** Findings of one severity. */
  public record FindingGroup(String heading, List<Item> items) {
    public FindingGroup {
      items = List.copyOf(items);
    }
  }

  /** A finding: its id, where in the file, what is so, what would be right. */
  public record Item(String id, String place, String message, String remedy) {}

  static GivenView of(Assessment a, Print print) {
    Design d = a.design();
    return new GivenView(
        GivenFacts.of(d, print),
        GivenTables.of(d, print),
        defaults(a.defaults()),
        findings(a),
        papers(d.documents()),
        a.input().name(),
        a.input().sha256());
  }

  private static Table defaults(List<DefaultTaken> taken) {
    return Table.of("Values that were not given")
        .words("key", taken.stream().map(DefaultTaken::path).toList())
        .words("taken instead", taken.stream().map(t -> Print.symbols(t.value())).toList())
        .words("source", taken.stream().map(DefaultTaken::source).toList())
        .brief("errs towards", taken.stream().map(t -> side(t.side())).toList())
        .build();
  }

  private static String side(DefaultTaken.Side side) {
    return switch (side) {
      case SAFE -> "the careful side";
      case NEUTRAL -> "neither";
      case UNKNOWN -> "unknown";
    };
  }

  private static List<FindingGroup> findings(Assessment a) {
    List<FindingGroup> groups = new ArrayList<>();
    add(groups, a, Finding.Severity.OPEN_POINT, "Missing: open points");
    add(groups, a, Finding.Severity.WARNING, "Doubtful: warnings");
    add(groups, a, Finding.Severity.ASSUMPTION, "Assumed");
    add(groups, a, Finding.Severity.NOTE, "Worth knowing");
    return List.copyOf(groups);
  }

  private static void add(
      List<FindingGroup> groups, Assessment a, Finding.Severity severity, String heading) {
    List<Item> items = a.findings(severity).stream().map(GivenView::item).toList();
    if (!items.isEmpty()) {
      groups.add(new FindingGroup(heading, items));
    }
  }

  private static Item item(Finding f) {
    String line = f.line() > 0 ? "line " + f.line() : "";
    String place =
        List.of(f.path(), line).stream()
            .filter(s -> !s.isBlank())
            .collect(Collectors.joining(", "));
    return new Item(f.id(), place, f.message(), f.remedy());
  }

  private static Table papers(List<Design.Paper> papers) {
    return Table.of("Papers relied on")
        .words("paper", papers.stream().map(Design.Paper::what).toList())
        .words("by", papers.stream().map(p -> Print.words(p.by())).toList())
        .brief("date", papers.stream().map(p -> Print.words(p.date())).toList())
        .words("used for", papers.stream().map(p -> Print.words(p.usedFor())).toList())
        .build();
  }
}
