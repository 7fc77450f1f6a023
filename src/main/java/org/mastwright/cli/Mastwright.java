package org.mastwright.cli;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.Set;
import org.mastwright.assess.Assessor;
import picocli.CommandLine;
import picocli.CommandLine.Command;

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
      Set.of("raise", "rig", "size", "vary", "compare", "package", "new", "page");

  private Mastwright() {}

  /** Runs and exits. */
  public static void main(String[] args) {
    PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
    PrintStream err = new PrintStream(System.err, true, StandardCharsets.UTF_8);
    System.exit(run(out, err, args));
  }

  /** Runs with streams of one's own; returns the exit code. */
  static int run(PrintStream out, PrintStream err, String... args) {
    if (args.length > 0 && LATER.contains(args[0])) {
      err.println("mastwright: " + args[0] + " is not built in this version.");
      return Exit.WRONG_COMMAND;
    }
    CommandLine line = new CommandLine(new Mastwright());
    line.addSubcommand("check", new CheckCommand(out, err));
    line.addSubcommand("readback", new ReadbackCommand(out, err));
    line.addSubcommand("speeds", new SpeedsCommand(out, err));
    line.addSubcommand("explain", new ExplainCommand(out, err));
    line.addSubcommand("schema", new SchemaCommand(out));
    line.setOut(new java.io.PrintWriter(out, true, StandardCharsets.UTF_8));
    line.setErr(new java.io.PrintWriter(err, true, StandardCharsets.UTF_8));
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
}
