package org.mastwright.cli;

import java.io.PrintStream;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import org.mastwright.file.Explain;
import org.mastwright.file.FaultCatalogue;
import org.mastwright.working.CheckCatalogue;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** {@code explain WORD}: a key, an error id, a check id. */
@Command(
    name = "explain",
    description = "a key of the tower file, an error id or a check id: what it means",
    mixinStandardHelpOptions = true)
final class ExplainCommand implements Callable<Integer> {
  @Parameters(paramLabel = "WORD", description = "such as tension, site.wind, E2 or guy-slack")
  private String word;

  private final PrintStream out;
  private final PrintStream err;

  ExplainCommand(PrintStream out, PrintStream err) {
    this.out = out;
    this.err = err;
  }

  @Override
  public Integer call() {
    List<String> lines = new ArrayList<>();
    CheckCatalogue.of(word).ifPresent(w -> lines.add(word + "   (check)\n  " + w));
    FaultCatalogue.of(word).ifPresent(w -> lines.add(word + "   (error or open point)\n  " + w));
    lines.addAll(Explain.key(word));
    if (lines.isEmpty()) {
      err.println(
          "mastwright: nothing is known of \""
              + word
              + "\". Give a key such as tension or site.wind.reference, an error id such as E2, or"
              + " a check id of the report.");
      return Exit.WRONG_COMMAND;
    }
    for (String line : String.join("\n", lines).split("\n")) {
      Words.wrapped(line).forEach(out::println);
    }
    return Exit.PASSES;
  }
}
