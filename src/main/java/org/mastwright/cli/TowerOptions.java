package org.mastwright.cli;

import java.nio.file.Path;
import java.util.Optional;
import org.mastwright.units.UnitSystem;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** What every command on a tower file takes. */
final class TowerOptions {
  /** As typed on the command line. */
  enum Units {
    SI,
    US,
    both
  }

  @Option(
      names = "--units",
      paramLabel = "SI|US|both",
      description = "units to print; default as in the file")
  private Units units;

  @Option(names = "--quiet", description = "nothing on the terminal but errors")
  boolean quiet;

  @Option(names = "--plain", description = "ASCII only, one fact per line, no colour")
  boolean plain;

  @Option(names = "--strict", description = "warnings end with exit 3, open points with exit 2")
  boolean strict;

  @Parameters(paramLabel = "FILE", description = "the tower file; - reads standard input")
  private String file;

  String file() {
    return file;
  }

  boolean piped() {
    return file.equals("-");
  }

  /** The name the outputs are called after. */
  String name() {
    Path last = piped() ? null : Path.of(file).getFileName();
    return last == null ? "standard-input.yaml" : last.toString();
  }

  /** Units asked for; empty for those of the file. */
  Optional<UnitSystem> units() {
    return units == null
        ? Optional.empty()
        : Optional.of(
            switch (units) {
              case SI -> UnitSystem.SI;
              case US -> UnitSystem.US;
              case both -> UnitSystem.BOTH;
            });
  }
}
