package org.mastwright.working;

/**
 * What a check is about.
 *
 * @param id unique, kebab-case, such as {@code guy-strength}; the same id for every place
 * @param title the question in a few plain words
 * @param question which of the report's questions it belongs to
 * @param where the worst place, such as {@code level 3 west, at the mast}
 * @param caseId the load case that governs, or {@code -}
 * @param why one sentence on why the detail matters; blank where none is needed
 */
public record Subject(
    String id, String title, Question question, String where, String caseId, String why) {
  public Subject {
    if (!id.matches("[a-z0-9]+(-[a-z0-9]+)*")) {
      throw new IllegalArgumentException("check id: " + id);
    }
    if (title.isBlank() || where.isBlank() || caseId.isBlank()) {
      throw new IllegalArgumentException("check " + id + " has no title, place or case");
    }
  }

  public Subject(String id, String title, Question question, String where, String caseId) {
    this(id, title, question, where, caseId, "");
  }
}
