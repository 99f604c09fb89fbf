package spanwright.cli;

import picocli.CommandLine.Option;

/** The option every command has. */
final class Help {
  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this and exit.")
  boolean help;
}
