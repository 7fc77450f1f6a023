package org.mastwright.cli;

import java.io.IOException;
import java.io.PrintStream;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.Assessor;
import org.mastwright.assess.SpeedResult;
import org.mastwright.file.Csv;
import org.mastwright.report.ReportException;
import org.mastwright.working.AnalysisException;
import picocli.CommandLine;
import picocli.CommandLine.Command;

/** {@code speeds FILE}: nothing but the rotor speeds to keep off. */
@Command(
    name = "speeds",
    description = "rotor speeds to avoid and clear ranges",
    mixinStandardHelpOptions = true)
final class SpeedsCommand implements Callable<Integer> {
  @CommandLine.Mixin private TowerOptions options;
  @CommandLine.Mixin private OutputOptions output;

  private final PrintStream out;
  private final PrintStream err;

  SpeedsCommand(PrintStream out, PrintStream err) {
    this.out = out;
    this.err = err;
  }

  @Override
  public Integer call() {
    Optional<TowerFileInput> read = TowerFileInput.read(options, err);
    if (read.isEmpty()) {
      return Exit.WRONG_FILE;
    }
    TowerFileInput input = read.get();
    Optional<String> missing = missing(input);
    if (missing.isPresent()) {
      err.println("mastwright: " + missing.get());
      return Exit.WRONG_FILE;
    }
    CheckCommand.warmUp();
    ProgressLine progress = new ProgressLine(err, options);
    long began = System.nanoTime();
    OutputFolder folder = new OutputFolder(output.folder(options.name()));
    Assessment a;
    try {
      a =
          Assessor.speeds(
              input.design(), input.mark(), input.reading().defaults(), input.findings(), progress);
      if (!folder.isOurs()) {
        progress.clear();
        err.println(folder.refusal());
        return Exit.NOT_WRITTEN;
      }
      progress.stage("printing the report", 0, 1);
      folder.add("speeds.pdf", Pdf.of(a, output));
      folder.add("speeds.csv", Csv.speeds(a.speeds().orElseThrow()));
      folder.addResults(a, input.content());
      folder.write();
    } catch (AnalysisException lost) {
      progress.clear();
      err.println("mastwright: " + lost.getMessage());
      return Exit.NO_EQUILIBRIUM;
    } catch (IOException | ReportException failed) {
      progress.clear();
      err.println("mastwright: the output could not be written: " + failed.getMessage());
      return Exit.NOT_WRITTEN;
    }
    progress.clear();
    SpeedResult speeds = a.speeds().orElseThrow();
    int exit = speeds.clear().isEmpty() ? Exit.FAILS : Exit.PASSES;
    if (!options.quiet) {
      double took_s = (System.nanoTime() - began) / 1e9;
      SpeedWords.of(a, folder.words(), took_s, exit, options.plain).forEach(out::println);
    }
    if (output.open) {
      Viewer.show(folder.path("speeds.pdf"), err);
    }
    return exit;
  }

  /** What this command needs and never guesses. */
  private static Optional<String> missing(TowerFileInput input) {
    if (input.design().verification().isPresent()) {
      return Optional.of("a verification file has no rotor.");
    }
    boolean guessed =
        input.reading().defaults().stream()
            .anyMatch(
                d ->
                    d.path().equals("turbine.rotor-speed")
                        || d.path().equals("turbine.rotor-speed.highest"));
    return guessed
        ? Optional.of(
            "turbine.rotor-speed.highest is not given. For `speeds` it is never guessed: write the"
                + " highest speed the rotor dwells at, such as  rotor-speed: {highest: 420 rpm}")
        : Optional.empty();
  }
}
