package spanwright.web;

import java.security.SecureRandom;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.RejectedExecutionException;
import java.util.concurrent.ThreadPoolExecutor;
import java.util.concurrent.TimeUnit;
import spanwright.plan.Plan;
import spanwright.search.Result;
import spanwright.search.Search;
import spanwright.store.SavedPlan;

/** Searches beside the requests: a few at once, a few waiting, the last few kept. */
final class Searches implements AutoCloseable {
  private static final int AT_ONCE = 2;
  private static final int WAITING = 4;

  /** A result with its roses and profiles takes a few megabytes. */
  private static final int KEPT = 12;

  private static final int ID_BYTES = 12;
  private static final int STOP_SECONDS = 5;

  private final Engine engine;
  private final SecureRandom random = new SecureRandom();
  private final Map<String, SearchJob> jobs = new LinkedHashMap<>();
  private final ThreadPoolExecutor pool =
      new ThreadPoolExecutor(
          AT_ONCE,
          AT_ONCE,
          1,
          TimeUnit.MINUTES,
          new ArrayBlockingQueue<>(WAITING),
          Searches::thread);

  Searches(Engine engine) {
    this.engine = engine;
    pool.allowCoreThreadTimeOut(true);
  }

  /** Below the requests, so that the page stays quick while a search runs. */
  private static Thread thread(Runnable work) {
    Thread thread = new Thread(work, "search");
    thread.setDaemon(true);
    thread.setPriority(Thread.NORM_PRIORITY - 2);
    return thread;
  }

  SearchJob start(SavedPlan saved, Plan plan, Search.Options options) {
    byte[] bytes = new byte[ID_BYTES];
    random.nextBytes(bytes);
    SearchJob job = new SearchJob(HexFormat.of().formatHex(bytes), saved, plan, options);
    try {
      pool.execute(() -> run(job));
    } catch (RejectedExecutionException e) {
      throw new ProblemException(
          Problem.busy(
              AT_ONCE
                  + " searches are running and "
                  + WAITING
                  + " more are waiting. Cancel one or wait until one is done."));
    }
    synchronized (jobs) {
      jobs.put(job.id(), job);
      forgetOldest();
    }
    return job;
  }

  Optional<SearchJob> find(String id) {
    synchronized (jobs) {
      return Optional.ofNullable(jobs.get(id));
    }
  }

  private void forgetOldest() {
    List<String> ended = new ArrayList<>();
    jobs.forEach(
        (id, job) -> {
          if (job.state() != SearchJob.State.RUNNING) {
            ended.add(id);
          }
        });
    for (int i = 0; i < ended.size() - KEPT; i++) {
      jobs.remove(ended.get(i));
    }
  }

  private void run(SearchJob job) {
    if (job.cancelled()) {
      return;
    }
    try {
      Result result = engine.search(job.plan(), job.options(), job);
      Finite.tree(result);
      job.done(result);
    } catch (Search.CancelledException e) {
      job.cancel();
    } catch (OutOfMemoryError e) {
      job.failed(
          Problem.of(
              500,
              "memory",
              "Not enough memory",
              "The search needs more memory than there is. Ask for less effort, or start the"
                  + " server with more (java -Xmx2g)."));
    } catch (RuntimeException | Error e) {
      job.failed(Errors.unforeseen(e));
    }
  }

  @Override
  public void close() {
    synchronized (jobs) {
      jobs.values().forEach(SearchJob::cancel);
    }
    pool.shutdownNow();
    try {
      pool.awaitTermination(STOP_SECONDS, TimeUnit.SECONDS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}
