package spanwright.store;

import com.fasterxml.jackson.core.JsonProcessingException;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import java.util.function.Predicate;
import spanwright.plan.Json;

/**
 * A folder of plans. All calls may come from any thread; one at a time touches the folder, so that
 * comparing a version and writing the next are one step.
 */
public final class PlanStore implements AutoCloseable {
  private static final String ENDING = JsonFile.ENDING;

  private final Path folder;
  private final FolderLock lock;
  private final List<String> notices = new ArrayList<>();
  private final IssuedRecords issued = new IssuedRecords(this);

  private PlanStore(Path folder, FolderLock lock) {
    this.folder = folder;
    this.lock = lock;
  }

  /**
   * Opens a folder, makes it if it is missing, and sets damaged files aside.
   *
   * @throws StoreTrouble with a sentence when it cannot be made, written or locked
   */
  public static PlanStore open(Path folder) {
    Path whole = folder.toAbsolutePath().normalize();
    try {
      Disk.makeFolder(whole);
    } catch (IOException e) {
      throw new StoreTrouble(
          "The data folder "
              + whole
              + " cannot be made ("
              + Disk.reason(e)
              + "). Choose another with --data.",
          e);
    }
    PlanStore store = new PlanStore(whole, FolderLock.take(whole));
    try {
      store.clearTemporaries();
      store.ids().forEach(store.issued::look);
      store.list();
    } catch (RuntimeException e) {
      store.close();
      throw e;
    }
    return store;
  }

  /** The folder, absolute. */
  public Path folder() {
    return folder;
  }

  /** What people should know about the folder: files set aside, files that cannot be read. */
  public synchronized List<String> notices() {
    return List.copyOf(notices);
  }

  /** The records of sheets issued, one beside each plan. */
  public IssuedRecords issued() {
    return issued;
  }

  /** Every plan that opens, latest save first. */
  public synchronized List<PlanEntry> list() {
    List<PlanEntry> all = new ArrayList<>();
    for (String id : ids()) {
      sound(id)
          .ifPresent(
              p -> all.add(new PlanEntry(id, titleOf(p.json(), id), p.version(), p.savedAt())));
    }
    all.sort(Comparator.comparing(PlanEntry::savedAt).reversed().thenComparing(PlanEntry::id));
    return List.copyOf(all);
  }

  /** The plan of that id, if there is one and it can be read. */
  public synchronized Optional<SavedPlan> find(String id) {
    return PlanIds.isSound(id) ? sound(id) : Optional.empty();
  }

  /** Saves a new plan under an id made from its title. */
  public synchronized SavedPlan create(String json) {
    String id = newId(PlanIds.word(titleOf(json, "")));
    return write(id, json, null);
  }

  /**
   * Replaces a plan, if the version it has is accepted; the two are one step.
   *
   * @return the new save, or empty when there is no such plan
   * @throws StaleVersion when the version is not accepted; nothing is written
   */
  public synchronized Optional<SavedPlan> replace(
      String id, String json, Predicate<String> accepted) {
    return find(id)
        .map(
            old -> {
              requireVersion(old, accepted);
              return write(id, json, old);
            });
  }

  /**
   * Takes a plan out of the list, if the version it has is accepted; its file is renamed, not lost.
   *
   * @return whether there was such a plan
   * @throws StaleVersion when the version is not accepted; nothing is changed
   */
  public synchronized boolean delete(String id, Predicate<String> accepted) {
    Optional<SavedPlan> old = find(id);
    if (old.isEmpty()) {
      return false;
    }
    requireVersion(old.get(), accepted);
    try {
      JsonFile.setAside(file(id), "deleted");
      return true;
    } catch (IOException e) {
      throw refused("deleted", id, e);
    }
  }

  @Override
  public synchronized void close() {
    lock.close();
  }

  private static void requireVersion(SavedPlan old, Predicate<String> accepted) {
    if (!accepted.test(old.version())) {
      throw new StaleVersion(old.id());
    }
  }

  private SavedPlan write(String id, String json, SavedPlan old) {
    Path target = file(id);
    try {
      byte[] bytes = json.getBytes(StandardCharsets.UTF_8);
      Instant time = JsonFile.timeAfter(old == null ? null : old.savedAt());
      Path fresh = Disk.writeBeside(target, bytes, time);
      if (old != null) {
        keepBefore(id, old);
      }
      Disk.rename(fresh, target);
      // Asked back, since a disk may keep times more coarsely than they were given.
      Instant kept = JsonFile.timeOf(target);
      return new SavedPlan(id, json, JsonFile.version(bytes, kept), kept);
    } catch (IOException e) {
      throw refused("saved", id, e);
    }
  }

  private void keepBefore(String id, SavedPlan old) throws IOException {
    Path before = before(id);
    byte[] bytes = old.json().getBytes(StandardCharsets.UTF_8);
    Disk.rename(Disk.writeBeside(before, bytes, old.savedAt()), before);
  }

  /** The plan of a sound id; a damaged file is set aside and the save before takes its place. */
  private Optional<SavedPlan> sound(String id) {
    Path path = file(id);
    if (!Files.isRegularFile(path)) {
      return Optional.empty();
    }
    try {
      Optional<SavedPlan> plan = read(id, path);
      if (plan.isPresent()) {
        return plan;
      }
      Path named = JsonFile.setAside(path, "damaged");
      boolean restored = restore(id);
      notice(
          "The saved plan "
              + id
              + " was damaged and is set aside as "
              + named.getFileName()
              + (restored ? "; the save before it has taken its place." : "."));
      return restored ? read(id, path) : Optional.empty();
    } catch (IOException e) {
      notice("The saved plan " + id + " cannot be read (" + Disk.reason(e) + ").");
      return Optional.empty();
    }
  }

  private boolean restore(String id) throws IOException {
    Path before = before(id);
    if (!Files.isRegularFile(before)) {
      return false;
    }
    Optional<SavedPlan> old = read(id, before);
    if (old.isEmpty()) {
      return false;
    }
    byte[] bytes = old.get().json().getBytes(StandardCharsets.UTF_8);
    Disk.rename(Disk.writeBeside(file(id), bytes, old.get().savedAt()), file(id));
    return true;
  }

  private static Optional<SavedPlan> read(String id, Path path) throws IOException {
    return JsonFile.read(path)
        .map(file -> new SavedPlan(id, file.json(), file.version(), file.savedAt()));
  }

  private static String titleOf(String json, String otherwise) {
    try {
      String title = Json.mapper().readTree(json).path("title").asText("").strip();
      return title.isEmpty() ? otherwise : title;
    } catch (JsonProcessingException e) {
      return otherwise;
    }
  }

  private TreeSet<String> ids() {
    TreeSet<String> ids = new TreeSet<>();
    for (String name : names("*" + ENDING)) {
      String id = name.substring(0, name.length() - ENDING.length());
      if (PlanIds.isSound(id)) {
        ids.add(id);
      } else if (!id.contains(".")) {
        notice(
            "The file "
                + name
                + " is left alone: a plan's file is named with small letters, digits and hyphens.");
      }
    }
    return ids;
  }

  /** One above every number the word has ever had here, deleted and damaged ones too. */
  private String newId(String word) {
    int highest = 0;
    for (String name : names(word + "-*")) {
      String rest = name.substring(word.length() + 1).replaceFirst("\\..*", "");
      if (rest.matches("[0-9]{1,8}")) {
        highest = Math.max(highest, Integer.parseInt(rest));
      }
    }
    return word + "-" + (highest + 1);
  }

  private List<String> names(String pattern) {
    List<String> names = new ArrayList<>();
    try (DirectoryStream<Path> stream = Files.newDirectoryStream(folder, pattern)) {
      stream.forEach(path -> names.add(path.getFileName().toString()));
      return names;
    } catch (IOException e) {
      throw new StoreTrouble(
          "The data folder " + folder + " cannot be read (" + Disk.reason(e) + ").", e);
    }
  }

  /** What a crash left behind in the middle of a write was never a save. */
  private void clearTemporaries() {
    for (String name : names("*" + ENDING + Disk.TEMPORARY)) {
      try {
        Files.deleteIfExists(folder.resolve(name));
      } catch (IOException e) {
        notice("The left-over file " + name + " cannot be deleted (" + Disk.reason(e) + ").");
      }
    }
  }

  void notice(String sentence) {
    if (!notices.contains(sentence)) {
      notices.add(sentence);
    }
  }

  private StoreTrouble refused(String what, String id, IOException e) {
    return trouble("The plan " + id, what, e);
  }

  StoreTrouble trouble(String thing, String what, IOException e) {
    return new StoreTrouble(
        thing
            + " could not be "
            + what
            + " in "
            + folder
            + " ("
            + Disk.reason(e)
            + "). What was saved before is untouched. Make room or give permission there, then try"
            + " again.",
        e);
  }

  private Path file(String id) {
    return folder.resolve(id + ENDING);
  }

  private Path before(String id) {
    return folder.resolve(id + ".previous" + ENDING);
  }
}
