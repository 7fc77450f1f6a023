package org.mastwright.file;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.mastwright.working.DefaultTaken;
import org.mastwright.working.Finding;

/** Everything found while reading one file, in the order found. */
final class Faults {
  /** Where the tower file lies; empty when it came from standard input. */
  final Optional<Path> folder;

  final List<Finding> all = new ArrayList<>();
  final List<Finding> findings = new ArrayList<>();
  final List<DefaultTaken> defaults = new ArrayList<>();

  Faults(Optional<Path> folder) {
    this.folder = folder;
  }

  void error(String id, Key at, String message, String remedy) {
    all.add(
        new Finding(
            id, Finding.Severity.ERROR, at.path(), at.line(), at.column(), message, remedy));
  }

  void warning(String id, Key at, String message, String remedy) {
    all.add(
        new Finding(
            id, Finding.Severity.WARNING, at.path(), at.line(), at.column(), message, remedy));
  }

  void open(String id, String path, String message, String remedy) {
    findings.add(Finding.at(id, Finding.Severity.OPEN_POINT, path, message, remedy));
  }

  void note(String id, String path, String message) {
    findings.add(Finding.at(id, Finding.Severity.NOTE, path, message, ""));
  }

  void taken(String path, String value, String source, DefaultTaken.Side side) {
    defaults.add(new DefaultTaken(path, value, source, side));
  }

  boolean hasErrors() {
    return all.stream().anyMatch(f -> f.severity() == Finding.Severity.ERROR);
  }
}
