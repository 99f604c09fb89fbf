package spanwright.web;

import io.javalin.http.Context;
import io.javalin.http.HandlerType;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.concurrent.Semaphore;

/**
 * Tells a browser about a search as it goes: server-sent events, written from the thread of the
 * request, with a comment each second so that a browser that left is noticed. One that comes back
 * says with {@code Last-Event-ID} how many placements it has.
 */
final class EventStream {
  private static final int MOST_LISTENERS = 24;
  private static final long BEAT_MS = 1000;

  private final Semaphore places = new Semaphore(MOST_LISTENERS);

  void serve(Context ctx, SearchJob job) {
    HttpServletResponse response = ctx.res();
    response.setContentType("text/event-stream; charset=utf-8");
    response.setHeader("Cache-Control", "no-store");
    if (ctx.method() == HandlerType.HEAD) {
      return;
    }
    if (!places.tryAcquire()) {
      throw new ProblemException(
          Problem.busy("Too many pages follow searches at once. Close one of them."));
    }
    try {
      OutputStream out = response.getOutputStream();
      response.flushBuffer();
      tell(out, job, new SearchJob.Cursor(lastSeen(ctx)));
    } catch (IOException e) {
      // The browser left; the search goes on for whoever asks next.
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    } finally {
      places.release();
    }
  }

  private static void tell(OutputStream out, SearchJob job, SearchJob.Cursor cursor)
      throws IOException, InterruptedException {
    while (!cursor.ended()) {
      List<SearchJob.Event> events = job.next(cursor, BEAT_MS);
      for (SearchJob.Event event : events) {
        write(out, event);
      }
      if (events.isEmpty()) {
        out.write(": still at it\n\n".getBytes(StandardCharsets.UTF_8));
      }
      out.flush();
    }
  }

  private static void write(OutputStream out, SearchJob.Event event) throws IOException {
    String id = event.number() > 0 ? "id: " + event.number() + "\n" : "";
    String text = id + "event: " + event.name() + "\ndata: " + event.data() + "\n\n";
    out.write(text.getBytes(StandardCharsets.UTF_8));
  }

  private static int lastSeen(Context ctx) {
    String header = ctx.header("Last-Event-ID");
    return header != null && header.matches("[0-9]{1,6}") ? Integer.parseInt(header) : 0;
  }
}
