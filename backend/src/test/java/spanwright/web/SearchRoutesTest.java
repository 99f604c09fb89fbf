package spanwright.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import spanwright.BrokenPlans;
import spanwright.plan.Plan;
import spanwright.search.Result;
import spanwright.search.Search;
import spanwright.store.PlanStore;

/** Searches over HTTP: what carries them, with a search that does as the test says. */
@Timeout(120)
class SearchRoutesTest {
  private static final String JSON = "application/json";

  /** Goes as far as the test lets it. */
  private static final class Held extends Engine {
    final CountDownLatch mayGoOn = new CountDownLatch(1);
    final AtomicInteger running = new AtomicInteger();
    final AtomicInteger most = new AtomicInteger();
    volatile RuntimeException fails;
    volatile Search.Options asked;

    @Override
    Result search(Plan plan, Search.Options options, Search.Listener listener) {
      asked = options;
      most.accumulateAndGet(running.incrementAndGet(), Math::max);
      try {
        listener.progress(new Search.Progress(0.25, "screening", 10, 3, 0));
        listener.found(SomePlacements.level(1));
        while (!mayGoOn.await(10, TimeUnit.MILLISECONDS)) {
          if (listener.cancelled()) {
            return null;
          }
        }
        if (fails != null) {
          throw fails;
        }
        listener.found(SomePlacements.level(2));
        return SomePlacements.result(plan, options, 2);
      } catch (InterruptedException e) {
        return null;
      } finally {
        running.decrementAndGet();
      }
    }
  }

  @TempDir Path folder;
  private PlanStore store;
  private WebServer server;
  private Client client;
  private final Held held = new Held();
  private String plan;

  @BeforeEach
  void start() {
    store = PlanStore.open(folder);
    server = WebServer.start(new WebServer.Options("127.0.0.1", 0, store, "test"), held);
    client = new Client(server);
    plan = client.post("/api/plans", BrokenPlans.SOUND, "Content-Type", JSON).header("Location");
  }

  @AfterEach
  void stop() {
    server.close();
    store.close();
  }

  private Client.Answer search(String body) {
    return client.post(plan + "/searches", body, "Content-Type", JSON);
  }

  private JsonNode until(String address, String state) throws InterruptedException {
    for (int i = 0; i < 3000; i++) {
      JsonNode search = client.get(address).json();
      if (search.get("state").asText().equals(state)) {
        return search;
      }
      Thread.sleep(10);
    }
    throw new AssertionError("never " + state + ": " + client.get(address).body());
  }

  @Test
  void a_search_is_started_asked_about_and_done() throws Exception {
    Client.Answer started = search("{\"effort\":\"quick\",\"seed\":7,\"top\":3}");
    assertEquals(202, started.status(), started.body());
    String address = started.header("Location");
    assertEquals("/api/searches/" + started.json().get("id").asText(), address);
    until(address, "running");
    held.mayGoOn.countDown();
    JsonNode done = until(address, "done");
    assertEquals(1.0, done.get("progress").asDouble());
    assertEquals("spanwright-result/1", done.get("result").get("format").asText());
    assertEquals(2, done.get("result").get("placements").size());
    assertEquals(7, held.asked.seed());
    assertEquals(3, held.asked.top());
    assertEquals("quick", held.asked.effort().word());
  }

  @Test
  void everything_about_a_search_may_be_left_out() {
    assertEquals(202, client.post(plan + "/searches", "").status());
    assertEquals(202, search("{}").status());
  }

  @Test
  void a_request_that_cannot_be_is_refused_with_its_faults() {
    for (String body :
        new String[] {
          "{\"effort\":\"heroic\"}",
          "{\"top\":0}",
          "{\"top\":2.5}",
          "{\"seed\":\"one\"}",
          "{\"seed\":1e40}",
          "{\"hurry\":true}",
          "[]"
        }) {
      Client.Answer answer = search(body);
      assertEquals(422, answer.status(), body);
      assertTrue(answer.json().get("faults").size() > 0, body);
      assertFalse(BrokenPlans.namesInnards(answer.body()), answer.body());
    }
    assertEquals(400, search("{").status());
    assertEquals(404, client.post("/api/plans/none/searches", "{}").status());
  }

  @Test
  void what_is_not_there_is_said_so() {
    assertEquals(404, client.get("/api/searches/none").status());
    assertEquals(404, client.get("/api/searches/none/events").status());
    assertEquals(404, client.delete("/api/searches/none").status());
    assertEquals(404, client.get("/api/searches/none/placements/p01/sheet.pdf").status());
    String running = search("{}").header("Location");
    Client.Answer early = client.get(running + "/placements/p01/sheet.pdf");
    assertEquals(404, early.status());
    assertTrue(early.body().contains("still running"), early.body());
    assertEquals(404, client.get(running + "/placements/p01/sheet.doc").status());
  }

  @Test
  void cancelling_ends_a_search_soon() throws Exception {
    String address = search("{}").header("Location");
    until(address, "running");
    assertEquals(204, client.delete(address).status());
    assertEquals("cancelled", client.get(address).json().get("state").asText());
    for (int i = 0; i < 1000 && held.running.get() > 0; i++) {
      Thread.sleep(10);
    }
    assertEquals(0, held.running.get());
    assertEquals(204, client.delete(address).status());
  }

  @Test
  void a_search_that_fails_says_so_without_naming_what_is_inside() throws Exception {
    held.fails = new IllegalStateException("org.secret.Inner blew up");
    held.mayGoOn.countDown();
    String address = search("{}").header("Location");
    JsonNode failed = until(address, "failed");
    String problem = failed.get("problem").toString();
    assertTrue(problem.contains("did not foresee"), problem);
    assertFalse(BrokenPlans.namesInnards(problem), problem);
  }

  @Test
  void only_so_many_run_at_once_and_only_so_many_wait() throws Exception {
    List<Client.Answer> answers = new ArrayList<>();
    for (int i = 0; i < 9; i++) {
      answers.add(search("{}"));
    }
    List<Integer> statuses = answers.stream().map(Client.Answer::status).toList();
    assertEquals(List.of(202, 202, 202, 202, 202, 202, 429, 429, 429), statuses);
    Client.Answer refused = answers.get(8);
    assertEquals("application/problem+json", refused.header("Content-Type"));
    assertTrue(refused.json().get("detail").asText().contains("Cancel one"), refused.body());
    held.mayGoOn.countDown();
    until(answers.get(5).header("Location"), "done");
    assertTrue(held.most.get() <= 2, "at once: " + held.most);
  }

  @Test
  void only_the_last_few_are_kept() throws Exception {
    held.mayGoOn.countDown();
    List<String> addresses = new ArrayList<>();
    for (int i = 0; i < 16; i++) {
      addresses.add(search("{}").header("Location"));
      until(addresses.get(i), "done");
    }
    assertEquals(404, client.get(addresses.get(0)).status());
    assertEquals(200, client.get(addresses.get(15)).status());
    assertEquals(200, client.get(addresses.get(4)).status());
  }

  /** Lines of an event stream, as they come. */
  private final class Stream implements AutoCloseable {
    private final BufferedReader reader;
    private final InputStream in;

    Stream(String address, String... headers) throws IOException, InterruptedException {
      HttpRequest.Builder request = HttpRequest.newBuilder(client.uri(address + "/events"));
      if (headers.length > 0) {
        request.headers(headers);
      }
      var response = Client.http().send(request.build(), BodyHandlers.ofInputStream());
      assertEquals(200, response.statusCode());
      assertTrue(
          response.headers().firstValue("Content-Type").orElse("").startsWith("text/event-stream"));
      in = response.body();
      reader = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8));
    }

    /** Up to the next blank line; null at the end. */
    String next() throws IOException {
      StringBuilder event = new StringBuilder();
      for (String line = reader.readLine(); line != null; line = reader.readLine()) {
        if (line.isEmpty()) {
          return event.toString();
        }
        event.append(line).append('\n');
      }
      return null;
    }

    /** The next event of that name. */
    JsonNode await(String name) throws IOException {
      for (String event = next(); event != null; event = next()) {
        if (event.contains("event: " + name + "\n")) {
          String data = event.replaceFirst("(?s).*data: ", "");
          return new com.fasterxml.jackson.databind.ObjectMapper().readTree(data);
        }
      }
      throw new AssertionError("no " + name);
    }

    @Override
    public void close() throws IOException {
      in.close();
    }
  }

  @Test
  void a_stream_tells_progress_what_is_found_and_the_end() throws Exception {
    String address = search("{}").header("Location");
    try (Stream stream = new Stream(address)) {
      JsonNode found = stream.await("found");
      assertEquals("p01", found.get("id").asText());
      assertTrue(found.has("conductors"));
      JsonNode progress = stream.await("progress");
      assertEquals(0.25, progress.get("progress").asDouble());
      assertEquals("screening", progress.get("what").asText());
      assertEquals(10, progress.get("considered").asInt());
      held.mayGoOn.countDown();
      assertEquals("p02", stream.await("found").get("id").asText());
      JsonNode done = stream.await("done");
      assertEquals(2, done.get("placements").size());
      assertEquals(null, stream.next());
    }
  }

  @Test
  void a_stream_breathes_while_nothing_happens() throws Exception {
    String address = search("{}").header("Location");
    try (Stream stream = new Stream(address)) {
      stream.await("progress");
      String next = stream.next();
      while (next.startsWith("id:") || next.startsWith("event:")) {
        next = stream.next();
      }
      assertTrue(next.startsWith(":"), next);
    }
  }

  @Test
  void who_comes_late_hears_it_all_and_who_comes_back_only_the_rest() throws Exception {
    held.mayGoOn.countDown();
    String address = search("{}").header("Location");
    until(address, "done");
    try (Stream stream = new Stream(address)) {
      assertEquals("p01", stream.await("found").get("id").asText());
      assertEquals("p02", stream.await("found").get("id").asText());
      stream.await("done");
    }
    try (Stream stream = new Stream(address, "Last-Event-ID", "1")) {
      assertEquals("p02", stream.await("found").get("id").asText());
    }
  }

  @Test
  void a_cancelled_search_ends_its_stream_with_a_problem() throws Exception {
    String address = search("{}").header("Location");
    try (Stream stream = new Stream(address)) {
      stream.await("progress");
      client.delete(address);
      JsonNode problem = stream.await("failed");
      assertEquals("urn:spanwright:problem:cancelled", problem.get("type").asText());
    }
  }

  @Test
  void browsers_that_left_make_room_for_others() throws Exception {
    String address = search("{}").header("Location");
    for (int i = 0; i < 24; i++) {
      new Stream(address).close();
    }
    // Those that left are noticed at the next beat.
    Thread.sleep(2500);
    try (Stream stream = new Stream(address)) {
      stream.await("progress");
    }
  }

  @Test
  void stopping_the_server_cancels_searches_and_ends_streams() throws Exception {
    String address = search("{}").header("Location");
    try (Stream stream = new Stream(address)) {
      stream.await("progress");
      long started = System.nanoTime();
      server.close();
      assertTrue(System.nanoTime() - started < 10_000_000_000L);
      assertEquals(0, held.running.get());
    }
  }
}
