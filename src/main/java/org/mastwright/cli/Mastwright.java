package org.mastwright.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.Assessor;
import org.mastwright.assess.Progress;
import org.mastwright.design.Design;
import org.mastwright.design.Project;
import org.mastwright.file.FaultCatalogue;
import org.mastwright.file.Reading;
import org.mastwright.file.ResultsJson;
import org.mastwright.file.TowerFiles;
import org.mastwright.report.Options;
import org.mastwright.report.ReportException;
import org.mastwright.report.ReportWriter;
import org.mastwright.units.UnitSystem;
import org.mastwright.working.AnalysisException;
import org.mastwright.working.CheckCatalogue;
import org.mastwright.working.Finding;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** The program. */
@Command(
    name = "mastwright",
    description = "Checks whether the tower of a small wind turbine meets the checks listed.",
    mixinStandardHelpOptions = true,
    version = "mastwright " + Assessor.VERSION,
    footer = "A calculation, not an approval: local codes and a licensed engineer decide.")
public final class Mastwright {
  /** Commands that are planned and not built. */
  private static final Set<String> LATER =
      Set.of(
          "raise",
          "rig",
          "size",
          "vary",
          "compare",
          "package",
          "new",
          "page",
          "schema",
          "readback");

  private final PrintStream out;
  private final PrintStream err;

  private Mastwright(PrintStream out, PrintStream err) {
    this.out = out;
    this.err = err;
  }

  /** What every command takes. */
  static final class Common {
    @Option(names = "--into", paramLabel = "FOLDER", description = "where the files go")
    Path into;

    @Option(names = "--units", description = "SI, US or both; default as in the file")
    String units;

    @Option(names = "--quiet", description = "nothing on the terminal but errors")
    boolean quiet;

    @Option(names = "--plain", description = "ASCII only, one fact per line")
    boolean plain;

    @Option(names = "--strict", description = "warnings end with exit 3, open points with exit 2")
    boolean strict;

    @Option(names = "--templates", paramLabel = "DIR", description = "report templates of your own")
    Path templates;

    @Parameters(paramLabel = "FILE", description = "the tower file; - reads standard input")
    String file;
  }

  /** Runs and exits. */
  public static void main(String[] args) {
    PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
    PrintStream err = new PrintStream(System.err, true, StandardCharsets.UTF_8);
    System.exit(run(out, err, args));
  }

  /** Runs with streams of one's own; returns the exit code. */
  static int run(PrintStream out, PrintStream err, String... args) {
    Mastwright program = new Mastwright(out, err);
    if (args.length > 0 && LATER.contains(args[0])) {
      err.println("mastwright: " + args[0] + " is not built in this version.");
      return Exit.WRONG_COMMAND;
    }
    CommandLine line = new CommandLine(program);
    line.addSubcommand("check", program.new CheckCommand());
    line.addSubcommand("speeds", program.new SpeedsCommand());
    line.addSubcommand("explain", program.new ExplainCommand());
    line.setOut(new java.io.PrintWriter(out, true));
    line.setErr(new java.io.PrintWriter(err, true));
    line.setParameterExceptionHandler(
        (wrong, given) -> {
          err.println("mastwright: " + wrong.getMessage());
          err.println("Try: mastwright --help");
          return Exit.WRONG_COMMAND;
        });
    line.setExecutionExceptionHandler(
        (fault, command, parsed) -> {
          err.println(
              "mastwright "
                  + Assessor.VERSION
                  + ": a fault in the program, not in your file: "
                  + fault
                  + " at "
                  + fault.getStackTrace()[0]
                  + ". Nothing it printed before this can be relied on.");
          return Exit.FAULT;
        });
    if (args.length == 0) {
      line.usage(out);
      return Exit.WRONG_COMMAND;
    }
    return line.execute(args);
  }

  /** {@code check FILE}. */
  @Command(name = "check", description = "everything the file allows: report, results, verdict")
  final class CheckCommand implements java.util.concurrent.Callable<Integer> {
    @CommandLine.Mixin Common common;

    @Override
    public Integer call() {
      return assess(common, false);
    }
  }

  /** {@code speeds FILE}. */
  @Command(name = "speeds", description = "rotor speeds to avoid and clear ranges")
  final class SpeedsCommand implements java.util.concurrent.Callable<Integer> {
    @CommandLine.Mixin Common common;

    @Override
    public Integer call() {
      return assess(common, true);
    }
  }

  /** {@code explain WORD}. */
  @Command(name = "explain", description = "more on an error id or a check id")
  final class ExplainCommand implements java.util.concurrent.Callable<Integer> {
    @Parameters(paramLabel = "WORD", description = "such as E2 or guy-slack")
    String word;

    @Override
    public Integer call() {
      Optional<String> words = CheckCatalogue.of(word).or(() -> FaultCatalogue.of(word));
      if (words.isEmpty()) {
        err.println("mastwright: nothing is known of \"" + word + "\".");
        return Exit.WRONG_COMMAND;
      }
      out.println(word + "  " + words.get());
      return Exit.PASSES;
    }
  }

  private int assess(Common common, boolean speeds) {
    byte[] content;
    String name;
    try {
      boolean piped = common.file.equals("-");
      content = piped ? System.in.readAllBytes() : Files.readAllBytes(Path.of(common.file));
      name = piped ? "standard-input.yaml" : Path.of(common.file).getFileName().toString();
    } catch (IOException missing) {
      err.println("mastwright: " + common.file + " cannot be read: " + missing.getMessage());
      return Exit.WRONG_FILE;
    }
    Reading reading = TowerFiles.read(name, content);
    boolean stop = common.strict && !reading.faults().isEmpty();
    if (reading.design().isEmpty() || stop) {
      Words.faults(reading).forEach(l -> err.println(common.plain ? Words.ascii(l) : l));
      return Exit.WRONG_FILE;
    }
    List<Finding> findings = new java.util.ArrayList<>(reading.findings());
    findings.addAll(reading.faults());
    if (reading.design().get().verification().isEmpty()) {
      Thread warming = new Thread(ReportWriter::warmUp, "pdf classes");
      warming.setDaemon(true);
      warming.start();
    }
    Assessment a;
    try {
      a =
          Assessor.assess(
              inUnits(reading.design().get(), common.units),
              new Assessment.InputFile(name, reading.sha256()),
              reading.defaults(),
              findings,
              progress(common));
    } catch (AnalysisException lost) {
      err.println("mastwright: " + lost.getMessage());
      return Exit.NO_EQUILIBRIUM;
    }
    return write(common, content, a, speeds);
  }

  /** One line per stage on standard error; replaced in place on a terminal. */
  private Progress progress(Common common) {
    if (common.quiet || System.console() == null) {
      return Progress.NONE;
    }
    return (words, done, of) ->
        err.print(
            "\r" + words + "  " + done + " of " + of + "\033[K" + (done == of ? "\r\033[K" : ""));
  }

  /** The design with the units that were asked for on the command line. */
  private static Design inUnits(Design d, String asked) {
    UnitSystem units =
        switch (Optional.ofNullable(asked).orElse("")) {
          case "SI" -> UnitSystem.SI;
          case "US" -> UnitSystem.US;
          case "both" -> UnitSystem.BOTH;
          default -> d.project().units();
        };
    Project p = d.project();
    Project project =
        new Project(
            p.title(),
            p.reference(),
            p.owner(),
            p.address(),
            p.parcel(),
            p.client(),
            p.date(),
            p.revision(),
            p.preparedBy(),
            p.checkedBy(),
            p.sheet(),
            units,
            p.declination_rad());
    return new Design(
        project,
        d.documents(),
        d.surroundings(),
        d.basis(),
        d.site(),
        d.turbine(),
        d.tower(),
        d.ground(),
        d.raising(),
        d.measured(),
        d.verification());
  }

  private int write(Common common, byte[] content, Assessment a, boolean speeds) {
    String stem = a.input().name().replaceFirst("\\.[^.]*$", "");
    Path folder = common.into != null ? common.into : Path.of(stem + "-check");
    OutputFolder output = new OutputFolder(folder);
    Map<String, byte[]> files = new LinkedHashMap<>();
    try {
      if (!output.isOurs()) {
        err.println(
            "mastwright: "
                + folder
                + " holds files that this program did not make; nothing was"
                + " written. Take another folder with --into.");
        return Exit.NOT_WRITTEN;
      }
      if (!Words.isVerification(a)) {
        ByteArrayOutputStream report = new ByteArrayOutputStream();
        ReportWriter.write(a, report, new Options(Optional.ofNullable(common.templates)));
        files.put("report.pdf", report.toByteArray());
      }
      files.put("tower-file.yaml", content);
      files.put("results.json", ResultsJson.bytes(a));
      output.write(files);
    } catch (IOException | ReportException failed) {
      err.println("mastwright: the output could not be written: " + failed.getMessage());
      return Exit.NOT_WRITTEN;
    }
    if (!common.quiet) {
      print(common, a, folder, files, speeds);
    }
    return speeds && a.speeds().isPresent()
        ? (a.speeds().get().clear().isEmpty() ? Exit.FAILS : Exit.PASSES)
        : a.exitCode();
  }

  private void print(
      Common common, Assessment a, Path folder, Map<String, byte[]> files, boolean speeds) {
    String written = folder + "/  " + String.join("  ", files.keySet());
    List<String> lines =
        Words.isVerification(a)
            ? Words.verification(a)
            : speeds
                ? Words.speeds(a, common.plain)
                : Words.summary(a, a.design().project().units(), written, common.plain);
    lines.forEach(out::println);
  }
}
