package org.mastwright.cli;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.mastwright.assess.Assessment;
import org.mastwright.design.Design;
import org.mastwright.file.Reading;
import org.mastwright.file.TowerFiles;
import org.mastwright.working.Finding;

/** A tower file read without an error, with its bytes. */
record TowerFileInput(byte[] content, Reading reading, Design design) {
  /** Reads what the command line names; says what is wrong on {@code err} and gives nothing. */
  static Optional<TowerFileInput> read(TowerOptions options, PrintStream err) {
    byte[] content;
    Optional<Path> folder = Optional.empty();
    try {
      if (options.piped()) {
        content = System.in.readAllBytes();
      } else {
        Path file = Path.of(options.file());
        content = Files.readAllBytes(file);
        folder = Optional.ofNullable(file.toAbsolutePath().getParent());
      }
    } catch (IOException | InvalidPathException missing) {
      err.println("mastwright: " + options.file() + " cannot be read: " + reason(missing));
      return Optional.empty();
    }
    Reading reading = TowerFiles.read(options.name(), content, folder);
    boolean stop = options.strict && !reading.faults().isEmpty();
    if (reading.design().isEmpty() || stop) {
      Words.faults(reading).forEach(l -> err.println(options.plain ? Words.ascii(l) : l));
      return Optional.empty();
    }
    Design design = reading.design().get();
    return Optional.of(
        new TowerFileInput(
            content, reading, options.units().map(design::withUnits).orElse(design)));
  }

  private static String reason(Exception missing) {
    return missing instanceof java.nio.file.NoSuchFileException
        ? "there is no such file."
        : String.valueOf(missing.getMessage());
  }

  /** Everything found while reading, warnings last. */
  List<Finding> findings() {
    List<Finding> all = new ArrayList<>(reading.findings());
    all.addAll(reading.faults());
    return all;
  }

  Assessment.InputFile mark() {
    return new Assessment.InputFile(reading.fileName(), reading.sha256());
  }
}
