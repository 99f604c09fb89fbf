package spanwright.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import spanwright.assess.WarmUp;
import spanwright.store.DataFolder;
import spanwright.store.PlanStore;
import spanwright.web.WebServer;

/** Runs the web app until it is stopped. */
@Command(name = "serve", description = "Runs the web app; prints its address when it answers.")
final class ServeCommand implements Callable<Integer> {
  private static final int HIGHEST_PORT = 65_535;

  private final Console console;
  private final CountDownLatch stopped = new CountDownLatch(1);

  @Spec CommandSpec spec;
  @Mixin Help help = new Help();

  @Option(
      names = "--port",
      paramLabel = "N",
      defaultValue = "7330",
      description = "Port to answer on; 0 takes a free one (default: ${DEFAULT-VALUE}).")
  int port;

  @Option(
      names = "--data",
      paramLabel = "DIR",
      description = "Folder of the plans; made if missing (default: in the user's data directory).")
  String data;

  @Option(
      names = "--host",
      paramLabel = "HOST",
      defaultValue = "127.0.0.1",
      description =
          "Address to answer on (default: ${DEFAULT-VALUE}). Any but loopback lets other machines"
              + " in, with the token that is printed.")
  String host;

  ServeCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() throws InterruptedException {
    if (port < 0 || port > HIGHEST_PORT) {
      throw new ParameterException(
          spec.commandLine(), "--port " + port + " is no port. Give 0 to " + HIGHEST_PORT + ".");
    }
    Path folder = data == null ? DataFolder.usual() : Documents.path(data);
    PlanStore store = PlanStore.open(folder);
    WebServer server = start(store);
    Thread hook = new Thread(() -> stop(server, store), "stop");
    Runtime.getRuntime().addShutdownHook(hook);
    store.notices().forEach(console.err()::println);
    console.out().println("Spanwright answers at " + server.address());
    console.out().println("Plans are kept in " + store.folder() + ". Ctrl-C stops the server.");
    console.out().flush();
    warmUp();
    stopped.await();
    return Exit.DONE;
  }

  /** The first search then starts at full speed; the page is not kept waiting for it. */
  private static void warmUp() {
    Thread thread = new Thread(WarmUp::run, "warm-up");
    thread.setDaemon(true);
    thread.setPriority(Thread.MIN_PRIORITY);
    thread.start();
  }

  private WebServer start(PlanStore store) {
    try {
      return WebServer.start(new WebServer.Options(host, port, store, VersionCommand.version()));
    } catch (RuntimeException e) {
      store.close();
      throw e;
    }
  }

  private void stop(WebServer server, PlanStore store) {
    server.close();
    store.close();
    stopped.countDown();
  }
}
