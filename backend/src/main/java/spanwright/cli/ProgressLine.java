package spanwright.cli;

import java.util.Locale;
import spanwright.search.Search;

/**
 * Tells on standard error how far a search has come: one line written over and over on a terminal,
 * a line for each step of five per cent when progress was asked for without one, else nothing.
 */
final class ProgressLine implements Search.Listener, AutoCloseable {
  private static final int STEP = 5;
  private static final int WIDTH = 78;

  private final Console console;
  private final boolean tells;
  private int told = -STEP;
  private String what = "";

  ProgressLine(Console console, boolean asked) {
    this.console = console;
    this.tells = asked || console.terminal();
  }

  @Override
  public void progress(Search.Progress made) {
    if (!tells) {
      return;
    }
    int percent = (int) Math.round(100 * made.share());
    String line =
        String.format(
            Locale.ROOT,
            "%3d %%  %s (%d considered, %d refused, %d solved)",
            percent,
            made.what(),
            made.considered(),
            made.refused(),
            made.solved());
    if (console.terminal()) {
      console.err().print("\r" + padded(line));
      console.err().flush();
    } else if (percent >= told + STEP || !made.what().equals(what)) {
      told = percent;
      what = made.what();
      console.err().println(line);
    }
  }

  private static String padded(String line) {
    return line.length() > WIDTH
        ? line.substring(0, WIDTH)
        : line + " ".repeat(WIDTH - line.length());
  }

  /** Leaves the terminal's line clean for what comes after. */
  @Override
  public void close() {
    if (tells && console.terminal()) {
      console.err().print("\r" + " ".repeat(WIDTH) + "\r");
      console.err().flush();
    }
  }
}
