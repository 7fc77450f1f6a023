package org.mastwright.cli;

import java.io.IOException;
import java.io.PrintStream;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.Assessor;
import org.mastwright.file.Csv;
import org.mastwright.report.ReportException;
import org.mastwright.report.ReportWriter;
import org.mastwright.working.AnalysisException;
import org.mastwright.working.Finding;
import picocli.CommandLine;
import picocli.CommandLine.Command;

/** {@code check FILE}. */
@Command(
    name = "check",
    description = "everything the file allows: report, results, verdict",
    mixinStandardHelpOptions = true)
final class CheckCommand implements Callable<Integer> {
  @CommandLine.Mixin private TowerOptions options;
  @CommandLine.Mixin private OutputOptions output;

  private final PrintStream out;
  private final PrintStream err;

  CheckCommand(PrintStream out, PrintStream err) {
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
    boolean verification = input.design().verification().isPresent();
    if (!verification) {
      warmUp();
    }
    ProgressLine progress = new ProgressLine(err, options);
    long began = System.nanoTime();
    Assessment a;
    try {
      a =
          Assessor.assess(
              input.design(), input.mark(), input.reading().defaults(), input.findings(), progress);
    } catch (AnalysisException lost) {
      progress.clear();
      err.println("mastwright: " + lost.getMessage());
      return Exit.NO_EQUILIBRIUM;
    }
    OutputFolder folder = new OutputFolder(output.folder(options.name()));
    try {
      if (!folder.isOurs()) {
        progress.clear();
        err.println(folder.refusal());
        return Exit.NOT_WRITTEN;
      }
      if (!verification) {
        progress.stage("printing the report", 0, 1);
        folder.add("report.pdf", Pdf.of(a, output));
        a.speeds().ifPresent(s -> folder.add("speeds.csv", Csv.speeds(s)));
      }
      if (!a.design().tower().guys().isEmpty()) {
        folder.add("guys.csv", Csv.guys(a));
      }
      folder.addResults(a, input.content());
      folder.write();
    } catch (IOException | ReportException failed) {
      progress.clear();
      err.println("mastwright: the output could not be written: " + failed.getMessage());
      return Exit.NOT_WRITTEN;
    }
    progress.clear();
    if (!options.quiet) {
      double took_s = (System.nanoTime() - began) / 1e9;
      List<String> lines =
          verification
              ? Words.verification(a, folder.words())
              : Summary.of(a, folder.words(), took_s, options.plain);
      Ink ink = new Ink(options.plain);
      lines.forEach(l -> out.println(ink.verdict(l)));
    }
    if (output.open && !verification) {
      Viewer.show(folder.path("report.pdf"), err);
    }
    return exit(a);
  }

  /** Open points end with 2 under {@code --strict} even where nothing else keeps it from 0. */
  private int exit(Assessment a) {
    boolean open = !a.findings(Finding.Severity.OPEN_POINT).isEmpty();
    return a.exitCode() == Exit.PASSES && options.strict && open ? Exit.INCOMPLETE : a.exitCode();
  }

  /** Loads the PDF classes while the analysis runs. */
  static void warmUp() {
    Thread warming = new Thread(ReportWriter::warmUp, "pdf classes");
    warming.setDaemon(true);
    warming.start();
  }
}
