package spanwright.web;

import com.fasterxml.jackson.core.JsonProcessingException;
import java.time.Instant;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import spanwright.assess.Placement;
import spanwright.plan.Json;
import spanwright.plan.Plan;
import spanwright.search.Result;
import spanwright.search.Search;
import spanwright.store.SavedPlan;

/**
 * One search, from its asking to its answer. It hears of its own progress from the searching
 * threads and hands it on to whoever waits in {@link #next}.
 */
final class SearchJob implements Search.Listener {
  /** Placements found that are told again to a browser which comes late. */
  private static final int MOST_FOUND = 500;

  private final String id;
  private final String planId;
  private final Instant savedAt;
  private final Plan plan;
  private final Search.Options options;

  private State state = State.RUNNING;
  private Search.Progress progress;
  private long progressNumber;
  private final List<String> found = new ArrayList<>();
  private int forgotten;
  private Result result;
  private Problem problem;

  /** What becomes of a search. */
  enum State {
    RUNNING,
    DONE,
    FAILED,
    CANCELLED
  }

  /**
   * Something to tell.
   *
   * @param name of the event
   * @param data JSON on one line
   * @param number of the placement found, from 1; 0 for other events
   */
  record Event(String name, String data, int number) {}

  /** How much of a search somebody has been told. */
  static final class Cursor {
    private int found;
    private long progress;
    private boolean ended;

    /** From the last event a browser says it has, when it comes back. */
    Cursor(int found) {
      this.found = found;
    }

    /** Whether the last event has been handed out. */
    boolean ended() {
      return ended;
    }
  }

  SearchJob(String id, SavedPlan saved, Plan plan, Search.Options options) {
    this.id = id;
    this.planId = saved.id();
    this.savedAt = saved.savedAt();
    this.plan = plan;
    this.options = options;
    this.progress = new Search.Progress(0, "waiting for its turn", 0, 0, 0);
  }

  String id() {
    return id;
  }

  /** Id of the saved plan that is searched. */
  String planId() {
    return planId;
  }

  Plan plan() {
    return plan;
  }

  /** When the plan searched was saved. */
  Instant savedAt() {
    return savedAt;
  }

  Search.Options options() {
    return options;
  }

  synchronized State state() {
    return state;
  }

  /** Every placement of the result; none while the search is not done. */
  synchronized List<Placement> placements() {
    return result == null ? List.of() : result.placements();
  }

  /** The placement of that id in the result, if the search is done and has it. */
  synchronized Optional<Placement> placement(String placementId) {
    return result == null
        ? Optional.empty()
        : result.placements().stream().filter(each -> each.id().equals(placementId)).findFirst();
  }

  @Override
  public synchronized void progress(Search.Progress made) {
    progress = made;
    progressNumber++;
    notifyAll();
  }

  @Override
  public void found(Placement placement) {
    String data = json(Finite.tree(placement));
    synchronized (this) {
      found.add(data);
      if (found.size() > MOST_FOUND) {
        found.remove(0);
        forgotten++;
      }
      notifyAll();
    }
  }

  @Override
  public synchronized boolean cancelled() {
    return state != State.RUNNING;
  }

  synchronized void cancel() {
    if (state == State.RUNNING) {
      problem = Problem.of(409, "cancelled", "Search cancelled", "The search was cancelled.");
      end(State.CANCELLED);
    }
  }

  synchronized void done(Result answer) {
    if (state == State.RUNNING) {
      result = answer;
      end(State.DONE);
    }
  }

  synchronized void failed(Problem why) {
    if (state == State.RUNNING) {
      problem = why;
      end(State.FAILED);
    }
  }

  private void end(State last) {
    state = last;
    notifyAll();
  }

  /** The document of {@code GET /api/searches/{id}}. */
  synchronized Map<String, Object> document() {
    Map<String, Object> document = new LinkedHashMap<>();
    document.put("id", id);
    document.put("state", state.name().toLowerCase(Locale.ROOT));
    document.put("progress", state == State.DONE ? 1.0 : progress.share());
    document.put("what", progress.what());
    if (result != null) {
      document.put("result", result);
    }
    if (problem != null) {
      document.put("problem", problem.document());
    }
    return document;
  }

  /** What the cursor has not seen yet; waits for it, but not longer than this. */
  synchronized List<Event> next(Cursor cursor, long milliseconds) throws InterruptedException {
    if (!hasNews(cursor)) {
      wait(milliseconds);
    }
    List<Event> events = new ArrayList<>();
    for (int i = Math.max(0, cursor.found - forgotten); i < found.size(); i++) {
      events.add(new Event("found", found.get(i), forgotten + i + 1));
    }
    cursor.found = forgotten + found.size();
    if (progressNumber > cursor.progress) {
      cursor.progress = progressNumber;
      events.add(new Event("progress", json(progressDocument()), 0));
    }
    if (state != State.RUNNING && !cursor.ended) {
      cursor.ended = true;
      events.add(last());
    }
    return events;
  }

  private boolean hasNews(Cursor cursor) {
    return state != State.RUNNING
        || cursor.found < forgotten + found.size()
        || cursor.progress < progressNumber;
  }

  private Event last() {
    return state == State.DONE
        ? new Event("done", json(result), 0)
        : new Event("failed", json(problem.document()), 0);
  }

  private Map<String, Object> progressDocument() {
    Map<String, Object> document = new LinkedHashMap<>();
    document.put("progress", progress.share());
    document.put("what", progress.what());
    document.put("considered", progress.considered());
    document.put("refused", progress.refused());
    document.put("solved", progress.solved());
    return document;
  }

  private static String json(Object document) {
    try {
      return Json.mapper().writeValueAsString(document);
    } catch (JsonProcessingException e) {
      throw new IllegalStateException(e);
    }
  }
}
