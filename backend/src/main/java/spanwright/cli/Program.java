package spanwright.cli;

import java.io.PrintWriter;
import java.util.UUID;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.ParameterException;
import spanwright.store.StoreTrouble;
import spanwright.web.ServerTrouble;

/** The commands, and how each way of failing is said. */
final class Program {
  /** Set to see where something unforeseen happened. */
  private static final String TRACE = "spanwright.trace";

  private Program() {}

  /** The command without a subcommand. */
  @Command(
      name = "spanwright",
      description = "Finds places to hang an HF wire on a small plot, and how to rig it.",
      synopsisSubcommandLabel = "COMMAND",
      mixinStandardHelpOptions = false)
  static final class Root implements Runnable {
    @CommandLine.Spec CommandLine.Model.CommandSpec spec;

    @CommandLine.Option(
        names = {"-h", "--help"},
        usageHelp = true,
        description = "Show this and exit.")
    boolean help;

    @Override
    public void run() {
      throw new ParameterException(spec.commandLine(), "Say which command you want.");
    }
  }

  /** Runs one command and returns its exit code. */
  static int run(Console console, String... args) {
    CommandLine line = new CommandLine(new Root());
    line.addSubcommand(new ServeCommand(console));
    line.addSubcommand(new CheckCommand(console));
    line.addSubcommand(new RankCommand(console));
    line.addSubcommand(new AssessCommand(console));
    line.addSubcommand(new SolveCommand(console));
    line.addSubcommand(new FeedCommand(console));
    line.addSubcommand(new HangCommand(console));
    line.addSubcommand(new SheetCommand(console));
    line.addSubcommand(new CatalogueCommand(console));
    line.addSubcommand(new VersionCommand(console));
    line.setOut(new PrintWriter(console.out(), true));
    line.setErr(new PrintWriter(console.err(), true));
    line.setCaseInsensitiveEnumValuesAllowed(true);
    line.setParameterExceptionHandler((e, given) -> badUsage(console, e));
    line.setExecutionExceptionHandler((e, failed, given) -> failed(console, e));
    try {
      return line.execute(args);
    } catch (OutOfMemoryError e) {
      console
          .err()
          .println(
              "There is not memory enough for this. Make the case smaller, or give Java more with"
                  + " -Xmx.");
    } catch (StackOverflowError e) {
      console.err().println("The document is nested too deeply to be read. Simplify it.");
    } catch (Error e) {
      unforeseen(console, e);
    }
    return Exit.COULD_NOT;
  }

  private static int badUsage(Console console, ParameterException e) {
    console.err().println(sentence(e));
    String name = e.getCommandLine().getCommandSpec().qualifiedName(" ");
    console.err().println("Try: " + name + " --help");
    return Exit.BAD_USAGE;
  }

  private static String sentence(ParameterException e) {
    if (e instanceof CommandLine.UnmatchedArgumentException unmatched) {
      boolean root = e.getCommandLine().getParent() == null;
      String first = unmatched.getUnmatched().get(0);
      return root && !first.startsWith("-")
          ? "There is no command " + first + "."
          : "What is meant by " + first + " is not known here.";
    }
    return e.getMessage();
  }

  private static int failed(Console console, Exception e) {
    if (e instanceof Failure failure) {
      failure.lines().forEach(console.err()::println);
      return failure.code();
    }
    if (e instanceof StoreTrouble || e instanceof ServerTrouble) {
      console.err().println(e.getMessage());
      return Exit.COULD_NOT;
    }
    return unforeseen(console, e);
  }

  private static int unforeseen(Console console, Throwable e) {
    String reference = UUID.randomUUID().toString().substring(0, 8);
    console
        .err()
        .println(
            "Spanwright met something it did not foresee (reference "
                + reference
                + "). Report it with the files you gave; java -Dspanwright.trace=true shows more.");
    if (Boolean.getBoolean(TRACE)) {
      e.printStackTrace(console.err());
    }
    return Exit.COULD_NOT;
  }
}
