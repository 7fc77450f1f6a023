package org.mastwright.cli;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.concurrent.Callable;
import org.mastwright.file.TowerFileSchema;
import picocli.CommandLine.Command;

/** {@code schema}. */
@Command(
    name = "schema",
    description = "the JSON Schema of a tower file, to standard output",
    mixinStandardHelpOptions = true)
final class SchemaCommand implements Callable<Integer> {
  private final PrintStream out;

  SchemaCommand(PrintStream out) {
    this.out = out;
  }

  @Override
  public Integer call() {
    out.print(new String(TowerFileSchema.bytes(), StandardCharsets.UTF_8));
    return Exit.PASSES;
  }
}
