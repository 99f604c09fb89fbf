package spanwright.search;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.BooleanSupplier;
import java.util.function.Function;

/**
 * Runs the same pure work on many items over some threads; answers come in the order of the items,
 * whatever the threads do.
 */
final class Workers implements AutoCloseable {
  private final ExecutorService pool;
  private final BooleanSupplier cancelled;

  Workers(int threads, BooleanSupplier cancelled) {
    this.pool =
        Executors.newFixedThreadPool(
            threads,
            task -> {
              Thread thread = new Thread(task, "search");
              thread.setDaemon(true);
              return thread;
            });
    this.cancelled = cancelled;
  }

  /** Thrown out of a search that was told to stop. */
  static final class Cancelled extends RuntimeException {
    private static final long serialVersionUID = 1L;

    Cancelled() {
      super("the search was cancelled");
    }
  }

  /**
   * @param done told after each item, one call at a time
   */
  <A, B> List<B> map(List<A> items, Function<A, B> work, Runnable done) {
    List<Future<B>> futures = new ArrayList<>(items.size());
    for (A item : items) {
      Callable<B> task =
          () -> {
            if (cancelled.getAsBoolean()) {
              throw new Cancelled();
            }
            B answer = work.apply(item);
            synchronized (done) {
              done.run();
            }
            return answer;
          };
      futures.add(pool.submit(task));
    }
    List<B> answers = new ArrayList<>(items.size());
    try {
      for (Future<B> future : futures) {
        answers.add(future.get());
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new Cancelled();
    } catch (ExecutionException e) {
      futures.forEach(future -> future.cancel(false));
      if (e.getCause() instanceof RuntimeException cause) {
        throw cause;
      }
      throw new IllegalStateException(e.getCause());
    }
    return answers;
  }

  @Override
  public void close() {
    pool.shutdownNow();
  }
}
