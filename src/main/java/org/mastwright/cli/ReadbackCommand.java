package org.mastwright.cli;

import java.io.PrintStream;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;

/** {@code readback FILE}: what was understood; nothing calculated, nothing written. */
@Command(
    name = "readback",
    description = "says what it understood and asks what is doubtful; nothing is calculated",
    mixinStandardHelpOptions = true)
final class ReadbackCommand implements Callable<Integer> {
  @CommandLine.Mixin private TowerOptions options;

  private final PrintStream out;
  private final PrintStream err;

  ReadbackCommand(PrintStream out, PrintStream err) {
    this.out = out;
    this.err = err;
  }

  @Override
  public Integer call() {
    Optional<TowerFileInput> input = TowerFileInput.read(options, err);
    if (input.isEmpty()) {
      return Exit.WRONG_FILE;
    }
    if (!options.quiet) {
      Readback.of(input.get(), options.plain).forEach(out::println);
    }
    return Exit.PASSES;
  }
}
