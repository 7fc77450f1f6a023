package org.mastwright.cli;

import java.nio.file.Path;
import picocli.CommandLine.Option;

/** Where the outputs go and how they look. */
final class OutputOptions {
  @Option(names = "--into", paramLabel = "FOLDER", description = "where the files go")
  Path into;

  @Option(names = "--templates", paramLabel = "DIR", description = "report templates of your own")
  Path templates;

  @Option(names = "--open", description = "show the report when it is written")
  boolean open;

  /** The folder: as asked, or beside where one stands, called after the tower file. */
  Path folder(String name) {
    return into != null ? into : Path.of(name.replaceFirst("\\.[^.]*$", "") + "-check");
  }
}
