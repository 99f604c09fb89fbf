package spanwright.search;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import spanwright.assess.Assessor;
import spanwright.assess.Hung;
import spanwright.assess.Placement;
import spanwright.assess.Unsolvable;
import spanwright.clearance.Refusal;
import spanwright.moments.GroundTables;
import spanwright.plan.Band;
import spanwright.plan.Catalogue;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;

/**
 * Searches a plan for places to hang a wire and ranks them. The same plan, seed and effort give the
 * same answer on any machine and with any number of threads: budgets count work, answers are taken
 * in the order of the questions, and every tie is settled by number.
 */
public final class Search {
  /** Layouts that screening dropped and that are looked at again only to say why. */
  private static final int EXPLAINED = 60;

  private final Plan plan;
  private final Catalogue catalogue;
  private final Options options;
  private final Listener listener;
  private final Assessor assessor;
  private final Refused refused = new Refused();
  private int considered;
  private int refusals;
  private int solved;

  /**
   * How to search.
   *
   * @param effort budget of work
   * @param seed shifts the sampling of mast zones
   * @param top most placements to return
   * @param threads to use, at least 1
   */
  public record Options(Effort effort, long seed, int top, int threads) {
    /** What the command line and the page ask for when nothing is said. */
    public static Options standard() {
      return new Options(Effort.NORMAL, 1, 12, Runtime.getRuntime().availableProcessors());
    }
  }

  /**
   * How far a search has come.
   *
   * @param share 0 to 1
   * @param what is being tried, in words
   * @param considered layouts made
   * @param refused by a rule
   * @param solved assessed in full
   */
  public record Progress(double share, String what, int considered, int refused, int solved) {}

  /** Hears of a search's progress; called from its threads, one call at a time. */
  public interface Listener {
    /** Work went on. */
    default void progress(Progress progress) {}

    /** A placement was assessed in full; its rank is provisional. */
    default void found(Placement placement) {}

    /** Whether to stop as soon as may be. */
    default boolean cancelled() {
      return false;
    }
  }

  /** Thrown out of {@link #run} when the listener said to stop. */
  public static final class CancelledException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    CancelledException(Throwable cause) {
      super("the search was cancelled", cause);
    }
  }

  private Search(
      Plan plan, Catalogue catalogue, GroundTables tables, Options options, Listener listener) {
    this.plan = plan;
    this.catalogue = catalogue;
    this.options = options;
    this.listener = listener;
    this.assessor = Assessor.of(plan, catalogue, tables);
  }

  /**
   * Searches and ranks.
   *
   * @throws CancelledException when the listener said to stop
   */
  public static Result run(Plan plan, Catalogue catalogue, Options options, Listener listener) {
    return run(plan, catalogue, new GroundTables(), options, listener);
  }

  /**
   * Searches and ranks on ground tables shared with others.
   *
   * @throws CancelledException when the listener said to stop
   */
  public static Result run(
      Plan plan, Catalogue catalogue, GroundTables tables, Options options, Listener listener) {
    long start = System.nanoTime();
    Search search = new Search(plan, catalogue, tables, options, listener);
    try (Workers workers = new Workers(options.threads(), listener::cancelled)) {
      List<Placement> ranked = search.rank(workers);
      search.say(0.98, "working out what would cure the refusals");
      List<Refusal> why =
          search.refused.list(
              search.assessor, workers, options.effort().refusals, ranked.isEmpty());
      if (search.considered == 0) {
        why = List.of(search.nothingToTry());
      }
      double seconds = Math.round((System.nanoTime() - start) / 1e7) / 100.0;
      return search.result(ranked, why, seconds);
    } catch (Workers.Cancelled e) {
      throw new CancelledException(e);
    }
  }

  private Refusal nothingToTry() {
    List<Double> centres = plan.brief().bands().stream().map(Band::middleMHz).toList();
    double least = new WireLengths(centres, 1).least() + 2 * WireRoom.LEAST_TAIL;
    return NothingToTry.refusal(plan, assessor.surface(), least);
  }

  private List<Placement> rank(Workers workers) {
    Effort effort = options.effort();
    say(0.01, "looking for places to hold a wire");
    List<Candidate> candidates = candidates();
    considered = candidates.size();
    List<Candidate> fitting = screen(workers, candidates);
    List<Free> free = hang(workers, byPromise(fitting, effort.hung));
    say(0.30, free.size() + " hang free");
    prepareTables(free);
    List<Free> coarse = coarse(workers, freeByPromise(free, effort.coarse));
    List<Assessed> full = full(workers, freeByScore(coarse, effort.full));
    List<Placement> varied = chosen(workers, full);
    return IntStream.range(0, varied.size()).mapToObj(i -> varied.get(i).ranked(i + 1)).toList();
  }

  /** A placement assessed in full, and what it was assessed from. */
  private record Assessed(Placement placement, Hung hung) {}

  /**
   * The list to show. What is on it is held against a finer mesh first; what does not stand that is
   * doubtful and falls behind, and what comes up in its place is tried in turn.
   */
  private List<Placement> chosen(Workers workers, List<Assessed> full) {
    say(0.95, "trying the best on a finer mesh");
    Map<Placement, Hung> untried = new IdentityHashMap<>();
    full.forEach(one -> untried.put(one.placement, one.hung));
    List<Placement> all = new ArrayList<>(full.stream().map(Assessed::placement).toList());
    while (true) {
      all.sort(Variety.BEST_FIRST);
      List<Placement> chosen = Variety.choose(all, options.top());
      List<Placement> next = chosen.stream().filter(untried::containsKey).toList();
      if (next.isEmpty()) {
        return chosen;
      }
      List<Placement> tried =
          workers.map(next, one -> assessor.refined(untried.get(one)), () -> {});
      Map<Placement, Placement> instead = new IdentityHashMap<>();
      for (int i = 0; i < next.size(); i++) {
        untried.remove(next.get(i));
        instead.put(next.get(i), tried.get(i));
      }
      all.replaceAll(one -> instead.getOrDefault(one, one));
    }
  }

  /** A candidate that hangs free of everything, with its coarse score once it has one. */
  private record Free(Candidate candidate, Hung hung, double score) {
    double promise() {
      return candidate.promise();
    }

    String family() {
      return candidate.family();
    }

    int number() {
      return candidate.number();
    }
  }

  private List<Candidate> candidates() {
    MastLimits limits = new MastLimits(plan, catalogue, assessor.surface());
    List<HoldSite> sites =
        HoldSites.of(
            plan,
            assessor.surface(),
            options.effort(),
            options.seed(),
            foot -> limits.highest(foot.zone(), foot.at()));
    List<Double> centres = plan.brief().bands().stream().map(Band::middleMHz).toList();
    return new Candidates(
            plan,
            sites,
            new WireRoom(plan, assessor.surface()),
            new Promise(assessor.aims(), assessor.surface()),
            new WireLengths(centres, options.effort().lengths),
            options.effort(),
            assessor.wireId(),
            assessor.lineId())
        .list();
  }

  private static List<Candidate> byPromise(List<Candidate> all, int most) {
    return ByFamily.take(all, most, Candidate::promise, Candidate::family, Candidate::number);
  }

  private static List<Free> freeByPromise(List<Free> all, int most) {
    return ByFamily.take(all, most, Free::promise, Free::family, Free::number);
  }

  private static List<Free> freeByScore(List<Free> all, int most) {
    return ByFamily.take(all, most, Free::score, Free::family, Free::number);
  }

  /**
   * Drops what cannot pass; looks again at the most promising of that only to be able to say why.
   */
  private List<Candidate> screen(Workers workers, List<Candidate> candidates) {
    Stage stage = new Stage(0.02, 0.08, candidates.size(), "screening");
    List<Boolean> passes =
        workers.map(candidates, c -> assessor.clearances().screen(c.layout()), stage::tick);
    List<Candidate> fitting = new ArrayList<>();
    List<Candidate> dropped = new ArrayList<>();
    for (int i = 0; i < candidates.size(); i++) {
      (passes.get(i) ? fitting : dropped).add(candidates.get(i));
    }
    refusals += dropped.size();
    List<Candidate> explained = byPromise(dropped, EXPLAINED);
    List<Optional<Hung>> hung = workers.map(explained, this::hangOne, () -> {});
    for (int i = 0; i < explained.size(); i++) {
      Candidate candidate = explained.get(i);
      hung.get(i).filter(h -> !h.allowed()).ifPresent(h -> refused.offer(candidate, h));
    }
    return fitting;
  }

  /** Hangs batch after batch, best promise first, until enough hang free or the budget is spent. */
  private List<Free> hang(Workers workers, List<Candidate> candidates) {
    Stage stage = new Stage(0.08, 0.30, candidates.size(), "hanging and measuring distances");
    int batch = Math.max(50, options.effort().hung / 8);
    int enough = 2 * options.effort().coarse;
    List<Free> free = new ArrayList<>();
    for (int from = 0; from < candidates.size() && free.size() < enough; from += batch) {
      List<Candidate> part = candidates.subList(from, Math.min(candidates.size(), from + batch));
      List<Optional<Hung>> hung = workers.map(part, this::hangOne, stage::tick);
      for (int i = 0; i < part.size(); i++) {
        sort(part.get(i), hung.get(i), free);
      }
    }
    return free;
  }

  private void sort(Candidate candidate, Optional<Hung> hung, List<Free> free) {
    if (hung.isPresent() && hung.get().allowed()) {
      free.add(new Free(candidate, hung.get(), 0));
    } else {
      refusals++;
      hung.ifPresent(h -> refused.offer(candidate, h));
    }
  }

  /** Empty when the layout cannot be hung at all, so that there is nothing to measure. */
  private Optional<Hung> hangOne(Candidate candidate) {
    try {
      return Optional.of(assessor.hangClosely(candidate.layout()));
    } catch (IllegalArgumentException impossible) {
      return Optional.empty();
    }
  }

  private void prepareTables(List<Free> free) {
    if (free.isEmpty()) {
      return;
    }
    say(0.30, "working out the ground");
    double reach = 0;
    double highest = 1;
    for (Free one : free) {
      List<Layout.Hold> holds = one.candidate.layout().attachments();
      for (Layout.Hold hold : holds) {
        Place at = hold.at();
        highest = Math.max(highest, at.z() - assessor.surface().heightAt(at.x(), at.y()));
        for (Layout.Hold other : holds) {
          reach = Math.max(reach, at.onPlan().distance(other.at().onPlan()));
        }
      }
    }
    assessor.prepareTables(reach, highest, options.threads());
  }

  private List<Free> coarse(Workers workers, List<Free> free) {
    Stage stage = new Stage(0.35, 0.60, free.size(), "a first look at gain and matching");
    List<Double> scores = workers.map(free, f -> assessor.coarseScore(f.hung), stage::tick);
    List<Free> scored = new ArrayList<>();
    for (int i = 0; i < free.size(); i++) {
      if (scores.get(i) > Double.NEGATIVE_INFINITY) {
        scored.add(new Free(free.get(i).candidate, free.get(i).hung, scores.get(i)));
      }
    }
    return scored;
  }

  private List<Assessed> full(Workers workers, List<Free> free) {
    Stage stage = new Stage(0.60, 0.95, free.size(), "solving every band in full");
    return workers.map(free, f -> assessed(assessor.told(f.hung)), stage::tick).stream()
        .flatMap(Optional::stream)
        .toList();
  }

  /** Empty when the field solver cannot take the shape on its full mesh: then it is left aside. */
  private Optional<Assessed> assessed(Hung hung) {
    try {
      Placement placement = assessor.assess(hung);
      found(placement);
      return Optional.of(new Assessed(placement, hung));
    } catch (Unsolvable aside) {
      return Optional.empty();
    }
  }

  private synchronized void found(Placement placement) {
    solved++;
    listener.found(placement.ranked(solved));
  }

  private synchronized void say(double share, String what) {
    listener.progress(new Progress(share, what, considered, refusals, solved));
  }

  /** Progress through one stage, told at every hundredth part of it. */
  private final class Stage {
    private final double from;
    private final double to;
    private final int size;
    private final String what;
    private int done;

    Stage(double from, double to, int size, String what) {
      this.from = from;
      this.to = to;
      this.size = size;
      this.what = what;
      say(from, what);
    }

    void tick() {
      done++;
      if (done % Math.max(1, size / 100) == 0) {
        say(from + (to - from) * done / size, what);
      }
    }
  }

  private Result result(List<Placement> ranked, List<Refusal> why, double seconds) {
    Result.Counts counts =
        new Result.Counts(
            considered,
            refusals,
            considered - refusals - solved,
            solved,
            assessor.tally().systems(),
            assessor.tally().meanUnknowns());
    return new Result(
        Result.FORMAT,
        plan.title() == null ? "" : plan.title(),
        options.seed(),
        options.effort().word(),
        counts,
        seconds,
        options.threads(),
        ranked,
        Result.Reference.of(plan),
        why);
  }
}
