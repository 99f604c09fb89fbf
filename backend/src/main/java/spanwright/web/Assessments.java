package spanwright.web;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.Semaphore;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import spanwright.assess.Assessor;
import spanwright.assess.Placement;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;

/**
 * Assesses placements while somebody drags an end: the same plan comes again and again, so the last
 * few are kept prepared. Bounded in number at once and in time.
 */
final class Assessments implements AutoCloseable {
  private static final int AT_ONCE = 2;
  private static final int PREPARED = 3;
  private static final long WAIT_SECONDS = 10;
  private static final long LONGEST_SECONDS = 60;

  private final Engine engine;
  private final Semaphore places = new Semaphore(AT_ONCE, true);
  private final ExecutorService threads =
      Executors.newCachedThreadPool(
          work -> {
            Thread thread = new Thread(work, "assess");
            thread.setDaemon(true);
            return thread;
          });

  private record Prepared(Plan plan, Assessor assessor) {}

  /** By the plan's text, last used last. */
  private final Map<String, Prepared> prepared = new LinkedHashMap<>(8, 0.75f, true);

  Assessments(Engine engine) {
    this.engine = engine;
  }

  /**
   * Assesses.
   *
   * @param text of the plan: what it is known by
   * @throws IllegalArgumentException with a sentence when the layout makes no sense
   */
  Placement assess(String text, Plan plan, Layout layout) {
    Future<Placement> future = enter(text, plan, layout);
    try {
      return future.get(LONGEST_SECONDS, TimeUnit.SECONDS);
    } catch (TimeoutException e) {
      future.cancel(true);
      throw new ProblemException(
          Problem.tooSlow(
              "Assessing this placement took more than "
                  + LONGEST_SECONDS
                  + " s and was given up. Ask for fewer bands, or less metalwork near the wire."));
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new ProblemException(Errors.unexpected(503));
    } catch (ExecutionException e) {
      if (e.getCause() instanceof RuntimeException unchecked) {
        throw unchecked;
      }
      throw new IllegalStateException(e.getCause());
    }
  }

  private Future<Placement> enter(String text, Plan plan, Layout layout) {
    try {
      if (!places.tryAcquire(WAIT_SECONDS, TimeUnit.SECONDS)) {
        throw new ProblemException(
            Problem.busy("The server is busy with other placements. Try again in a moment."));
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new ProblemException(Errors.unexpected(503));
    }
    // The place is given back when the work ends, which may be after its asker gave up.
    return threads.submit(
        () -> {
          try {
            return engine.assess(prepared(text, plan), layout);
          } finally {
            places.release();
          }
        });
  }

  /** The plan of this text when it was assessed on lately: it need not be read again; or null. */
  Plan known(String text) {
    synchronized (prepared) {
      Prepared known = prepared.get(text);
      return known == null ? null : known.plan;
    }
  }

  private Assessor prepared(String text, Plan plan) {
    synchronized (prepared) {
      Prepared known = prepared.get(text);
      if (known == null) {
        known = new Prepared(plan, engine.prepare(plan));
        prepared.put(text, known);
        if (prepared.size() > PREPARED) {
          prepared.remove(prepared.keySet().iterator().next());
        }
      }
      return known.assessor;
    }
  }

  @Override
  public void close() {
    threads.shutdownNow();
  }
}
