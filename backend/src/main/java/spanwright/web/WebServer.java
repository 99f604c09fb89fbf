package spanwright.web;

import io.javalin.Javalin;
import io.javalin.config.JavalinConfig;
import io.javalin.json.JavalinJackson;
import java.io.IOException;
import java.net.BindException;
import java.net.InetAddress;
import java.net.NetworkInterface;
import java.net.SocketException;
import java.net.UnknownHostException;
import java.util.HashSet;
import java.util.Set;
import java.util.concurrent.atomic.AtomicInteger;
import org.eclipse.jetty.server.HttpConfiguration;
import org.eclipse.jetty.util.thread.QueuedThreadPool;
import spanwright.plan.Json;
import spanwright.store.PlanStore;

/** The web app while it runs: started by {@link #start}, ended by {@link #close}. */
public final class WebServer implements AutoCloseable {
  private static final int MOST_THREADS = 64;
  private static final int HEADER_BYTES = 16 << 10;
  private static final long IDLE_MS = 30_000;

  private final Javalin app;
  private final Api api;
  private final String host;
  private final String token;

  private WebServer(Javalin app, Api api, String host, String token) {
    this.app = app;
    this.api = api;
    this.host = host;
    this.token = token;
  }

  /**
   * What to serve, and where.
   *
   * @param host name or address to answer on; anything but loopback needs the token
   * @param port to answer on; 0 takes a free one
   * @param store the plans; stays its opener's to close
   * @param version of the program, as shown
   */
  public record Options(String host, int port, PlanStore store, String version) {}

  /**
   * Starts, and returns when it answers.
   *
   * @throws ServerTrouble with a sentence when it cannot
   */
  public static WebServer start(Options options) {
    return start(options, new Engine());
  }

  static WebServer start(Options options, Engine engine) {
    InetAddress address = resolve(options.host());
    AtomicInteger port = new AtomicInteger();
    Gate gate = new Gate(options.host(), namesOf(address), address.isLoopbackAddress(), port::get);
    Api api = new Api(options, engine);
    Javalin app =
        Javalin.create(
            cfg -> {
              configure(cfg);
              cfg.jetty.host = address.getHostAddress();
              cfg.jetty.port = options.port();
              cfg.routes.before(gate::check);
              Errors.install(cfg);
              api.install(cfg.routes);
            });
    try {
      app.start();
    } catch (RuntimeException e) {
      api.close();
      throw trouble(options, e);
    }
    port.set(app.port());
    return new WebServer(app, api, Gate.bracketed(options.host()), gate.token());
  }

  private static void configure(JavalinConfig cfg) {
    cfg.startup.showJavalinBanner = false;
    cfg.startup.showOldJavalinVersionWarning = false;
    cfg.startup.startupWatcherEnabled = false;
    cfg.http.prefer405over404 = true;
    cfg.http.maxRequestSize = Requests.MOST_BYTES;
    cfg.http.generateEtags = false;
    cfg.router.ignoreTrailingSlashes = false;
    cfg.jsonMapper(new JavalinJackson(Json.mapper(), false));
    cfg.resourceHandler(new StaticPages());
    QueuedThreadPool pool = new QueuedThreadPool(MOST_THREADS, 4);
    pool.setName("http");
    cfg.jetty.threadPool = pool;
    cfg.jetty.modifyServer(
        server -> {
          server.setErrorHandler(new JettyErrors());
          // By then searches and event streams have ended, and a save is whole or not there.
          server.setStopTimeout(0);
        });
    cfg.jetty.modifyHttpConfiguration(WebServer::configureHttp);
  }

  private static void configureHttp(HttpConfiguration http) {
    http.setSendServerVersion(false);
    http.setSendXPoweredBy(false);
    http.setRequestHeaderSize(HEADER_BYTES);
    http.setIdleTimeout(IDLE_MS);
    http.addCustomizer(
        (request, answer) -> {
          Headers.ALWAYS.forEach(answer::put);
          return request;
        });
  }

  private static InetAddress resolve(String host) {
    try {
      return InetAddress.getByName(host);
    } catch (UnknownHostException e) {
      throw new ServerTrouble(
          "The host " + host + " is not known here. Give an address of this machine with --host.",
          e);
    }
  }

  /** When it answers on all addresses, each of them is a name of this server. */
  private static Set<String> namesOf(InetAddress address) {
    Set<String> names = new HashSet<>();
    names.add(address.getHostAddress());
    if (!address.isAnyLocalAddress()) {
      return names;
    }
    try {
      names.add(InetAddress.getLocalHost().getHostName());
      NetworkInterface.networkInterfaces()
          .flatMap(NetworkInterface::inetAddresses)
          .forEach(own -> names.add(own.getHostAddress().replaceFirst("%.*", "")));
    } catch (SocketException | UnknownHostException e) {
      // Then only the names already there are known.
    }
    return names;
  }

  private static ServerTrouble trouble(Options options, RuntimeException e) {
    Throwable deepest = e;
    while (deepest.getCause() != null) {
      deepest = deepest.getCause();
    }
    if (!(deepest instanceof IOException)) {
      throw e;
    }
    boolean taken =
        deepest instanceof BindException && String.valueOf(deepest.getMessage()).contains("in use");
    return new ServerTrouble(
        taken
            ? "Port "
                + options.port()
                + " is taken by another program. Stop it, or choose another with --port (0 takes a"
                + " free one)."
            : "The server cannot answer on "
                + Gate.bracketed(options.host())
                + ", port "
                + options.port()
                + ". Choose an address of this machine with --host and a port above 1023 with"
                + " --port.",
        e);
  }

  /** The port it answers on. */
  public int port() {
    return app.port();
  }

  /** What to open in a browser, with the token when one is needed. */
  public String address() {
    return "http://" + host + ":" + port() + "/" + (token == null ? "" : "?token=" + token);
  }

  /** Cancels searches, lets open answers end, and stops. */
  @Override
  public void close() {
    api.close();
    app.stop();
  }
}
