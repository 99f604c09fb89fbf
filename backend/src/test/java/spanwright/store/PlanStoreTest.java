package spanwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What the folder of plans promises. */
class PlanStoreTest {
  private static final String GARDEN = "{\"title\":\"Back garden\",\"notes\":\"one\"}";
  private static final String CHANGED = "{\"title\":\"Back garden\",\"notes\":\"two\"}";

  @TempDir Path temp;
  private Path folder;
  private PlanStore store;

  @BeforeEach
  void open() {
    folder = temp.resolve("made/when/missing");
    store = PlanStore.open(folder);
  }

  @AfterEach
  void close() {
    store.close();
  }

  private void reopen() {
    store.close();
    store = PlanStore.open(folder);
  }

  private List<String> files() throws IOException {
    try (Stream<Path> all = Files.list(folder)) {
      return all.map(path -> path.getFileName().toString()).sorted().toList();
    }
  }

  private String fileLike(String pattern) throws IOException {
    return files().stream().filter(name -> name.matches(pattern)).findFirst().orElseThrow();
  }

  @Test
  void a_plan_comes_back_exactly_as_it_was_sent() {
    String odd = "{ \"title\" : \"Hof\\u00e4cker\",\n\t\"unfinished\": [1.50, 2e0] }\n";
    SavedPlan saved = store.create(odd);
    reopen();
    SavedPlan found = store.find(saved.id()).orElseThrow();
    assertEquals(odd, found.json());
    assertEquals(saved.version(), found.version());
    assertEquals(saved.savedAt(), found.savedAt());
  }

  @Test
  void an_id_is_the_title_in_plain_letters_and_a_number() {
    assertEquals("back-garden-1", store.create(GARDEN).id());
    assertEquals("back-garden-2", store.create(GARDEN).id());
    assertEquals("konigs-hof-1", store.create("{\"title\":\"  König's Hof!\"}").id());
    assertEquals("plan-1", store.create("{\"title\":\"..\\\\..\"}").id());
    assertEquals("plan-2", store.create("{\"title\":[3]}").id());
    String words = "{\"title\":\"" + "long ".repeat(100) + "\"}";
    assertTrue(PlanIds.isSound(store.create(words).id()));
  }

  @Test
  void the_list_has_the_latest_save_first() {
    SavedPlan first = store.create(GARDEN);
    store.create("{}");
    store.replace(first.id(), CHANGED, version -> true);
    List<PlanEntry> list = store.list();
    assertEquals(List.of("back-garden-1", "plan-1"), list.stream().map(PlanEntry::id).toList());
    assertEquals("Back garden", list.get(0).title());
    assertEquals("plan-1", list.get(1).title());
  }

  @Test
  void every_save_has_another_version_even_of_the_same_text() {
    SavedPlan saved = store.create(GARDEN);
    List<String> versions = new ArrayList<>(List.of(saved.version()));
    for (int i = 0; i < 20; i++) {
      versions.add(store.replace(saved.id(), GARDEN, v -> true).orElseThrow().version());
    }
    assertEquals(versions.size(), versions.stream().distinct().count());
  }

  @Test
  void every_save_keeps_the_one_before() throws IOException {
    String id = store.create(GARDEN).id();
    store.replace(id, CHANGED, v -> true);
    assertEquals(GARDEN, Files.readString(folder.resolve(id + ".previous.json")));
    assertEquals(CHANGED, Files.readString(folder.resolve(id + ".json")));
    assertEquals(1, store.list().size());
  }

  @Test
  void a_stale_version_neither_replaces_nor_deletes() throws IOException {
    SavedPlan old = store.create(GARDEN);
    SavedPlan now = store.replace(old.id(), CHANGED, old.version()::equals).orElseThrow();
    assertThrows(StaleVersion.class, () -> store.replace(old.id(), "{}", old.version()::equals));
    assertThrows(StaleVersion.class, () -> store.delete(old.id(), old.version()::equals));
    assertEquals(CHANGED, store.find(old.id()).orElseThrow().json());
    assertEquals(now.version(), store.find(old.id()).orElseThrow().version());
    assertEquals(GARDEN, Files.readString(folder.resolve(old.id() + ".previous.json")));
  }

  @Test
  void of_many_who_saw_the_same_version_one_alone_saves() throws Exception {
    SavedPlan seen = store.create(GARDEN);
    ExecutorService threads = Executors.newFixedThreadPool(8);
    List<Callable<Boolean>> rivals = new ArrayList<>();
    for (int i = 0; i < 24; i++) {
      String text = "{\"title\":\"rival " + i + "\"}";
      rivals.add(
          () -> {
            try {
              return store.replace(seen.id(), text, seen.version()::equals).isPresent();
            } catch (StaleVersion e) {
              return false;
            }
          });
    }
    int won = 0;
    for (Future<Boolean> rival : threads.invokeAll(rivals)) {
      won += rival.get() ? 1 : 0;
    }
    threads.shutdown();
    assertEquals(1, won);
  }

  @Test
  void whoever_reads_while_others_write_sees_a_whole_plan() throws Exception {
    String id = store.create(GARDEN).id();
    AtomicBoolean writing = new AtomicBoolean(true);
    Thread writer =
        new Thread(
            () -> {
              for (int i = 0; i < 40; i++) {
                String text = "{\"n\":\"" + String.valueOf(i).repeat(20_000) + "\"}";
                store.replace(id, text, v -> true);
              }
              writing.set(false);
            });
    writer.start();
    while (writing.get()) {
      // Past the store, as another program would look at the file.
      String text = Files.readString(folder.resolve(id + ".json"));
      assertTrue(text.startsWith("{") && text.endsWith("}"));
    }
    writer.join();
  }

  @Test
  void deleting_takes_a_plan_from_the_list_and_keeps_its_file() throws IOException {
    SavedPlan saved = store.create(GARDEN);
    assertTrue(store.delete(saved.id(), saved.version()::equals));
    assertTrue(store.list().isEmpty());
    assertTrue(store.find(saved.id()).isEmpty());
    assertFalse(store.delete(saved.id(), v -> true));
    String kept = fileLike("back-garden-1\\.deleted-.*\\.json");
    assertEquals(GARDEN, Files.readString(folder.resolve(kept)));
  }

  @Test
  void the_id_of_a_deleted_plan_is_not_given_to_another() {
    SavedPlan saved = store.create(GARDEN);
    store.delete(saved.id(), v -> true);
    assertNotEquals(saved.id(), store.create(GARDEN).id());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "{\"title\":\"Ba", "[1,2]", "\u0000\u0000\u0000", "{} {}", "null"})
  void a_damaged_file_is_set_aside_and_the_rest_still_opens(String rubbish) throws IOException {
    String hurt = store.create(GARDEN).id();
    String whole = store.create("{\"title\":\"Other\"}").id();
    Files.writeString(folder.resolve(hurt + ".json"), rubbish);
    reopen();
    assertEquals(List.of(whole), store.list().stream().map(PlanEntry::id).toList());
    String aside = fileLike(hurt + "\\.damaged-.*\\.json");
    assertEquals(rubbish, Files.readString(folder.resolve(aside)));
    assertTrue(store.notices().stream().anyMatch(notice -> notice.contains(aside)));
  }

  @Test
  void bytes_that_are_not_text_are_damage_too() throws IOException {
    String id = store.create(GARDEN).id();
    Files.write(
        folder.resolve(id + ".json"), new byte[] {'{', '"', (byte) 0xff, '"', ':', '1', '}'});
    assertTrue(store.find(id).isEmpty());
    fileLike(id + "\\.damaged-.*\\.json");
  }

  @Test
  void the_save_before_takes_the_place_of_a_damaged_file() throws IOException {
    String id = store.create(GARDEN).id();
    store.replace(id, CHANGED, v -> true);
    Files.writeString(folder.resolve(id + ".json"), "{\"title\":");
    assertEquals(GARDEN, store.find(id).orElseThrow().json());
    assertTrue(store.notices().get(0).contains("the save before it has taken its place"));
    reopen();
    assertEquals(GARDEN, store.find(id).orElseThrow().json());
  }

  @Test
  void damage_seen_while_running_does_not_wait_for_the_next_start() throws IOException {
    String id = store.create(GARDEN).id();
    Files.writeString(folder.resolve(id + ".json"), "rubbish");
    assertTrue(store.list().isEmpty());
    fileLike(id + "\\.damaged-.*\\.json");
  }

  @Test
  void what_a_crash_left_half_written_is_cleared_and_the_old_save_stays() throws IOException {
    String id = store.create(GARDEN).id();
    Files.writeString(folder.resolve(id + ".json.tmp"), "{\"title\":\"half");
    reopen();
    assertEquals(GARDEN, store.find(id).orElseThrow().json());
    assertFalse(Files.exists(folder.resolve(id + ".json.tmp")));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "..",
        "../secret",
        "a/b",
        "a\\b",
        "A",
        "a.previous",
        "a..b",
        "-a",
        "a-",
        "a--b",
        "",
        "a b",
        "ä",
        "con:",
        "%2e%2e",
        "a\u0000"
      })
  void an_unsound_id_never_becomes_a_path(String id) throws IOException {
    Files.writeString(temp.resolve("made/when/secret.json"), GARDEN);
    assertTrue(store.find(id).isEmpty());
    assertTrue(store.replace(id, CHANGED, v -> true).isEmpty());
    assertFalse(store.delete(id, v -> true));
    assertEquals(GARDEN, Files.readString(temp.resolve("made/when/secret.json")));
  }

  @Test
  void an_id_too_long_is_unsound() {
    assertFalse(PlanIds.isSound("a".repeat(65)));
    assertTrue(PlanIds.isSound("a".repeat(64)));
  }

  @Test
  void a_file_with_another_kind_of_name_is_left_alone_and_mentioned() throws IOException {
    Files.writeString(folder.resolve("My Plan.json"), GARDEN);
    reopen();
    assertTrue(store.list().isEmpty());
    assertTrue(store.notices().get(0).startsWith("The file My Plan.json is left alone"));
    assertTrue(Files.exists(folder.resolve("My Plan.json")));
  }

  @Test
  void a_plan_copied_into_the_folder_opens() throws IOException {
    Files.write(folder.resolve("copied.json"), GARDEN.getBytes(StandardCharsets.UTF_8));
    assertEquals("Back garden", store.list().get(0).title());
    assertEquals(GARDEN, store.find("copied").orElseThrow().json());
  }

  @Test
  void two_stores_cannot_have_one_folder() {
    StoreTrouble trouble = assertThrows(StoreTrouble.class, () -> PlanStore.open(folder));
    assertTrue(trouble.getMessage().contains("is in use by another running Spanwright"));
    assertTrue(trouble.getMessage().contains("--data"));
    reopen();
  }

  @Test
  void a_folder_that_cannot_be_made_is_said_in_a_sentence() throws IOException {
    Path file = Files.writeString(temp.resolve("file"), "");
    StoreTrouble trouble =
        assertThrows(StoreTrouble.class, () -> PlanStore.open(file.resolve("data")));
    assertTrue(trouble.getMessage().startsWith("The data folder "), trouble.getMessage());
    assertFalse(trouble.getMessage().contains("Exception"), trouble.getMessage());
    StoreTrouble itself = assertThrows(StoreTrouble.class, () -> PlanStore.open(file));
    assertFalse(itself.getMessage().contains("Exception"), itself.getMessage());
  }

  @Test
  void a_save_the_disk_refuses_says_so_and_leaves_the_plan_as_it_was() throws IOException {
    SavedPlan saved = store.create(GARDEN);
    // A folder where the temporary file would go: refused whoever runs the test.
    Files.createDirectory(folder.resolve(saved.id() + ".json.tmp"));
    StoreTrouble trouble =
        assertThrows(StoreTrouble.class, () -> store.replace(saved.id(), CHANGED, v -> true));
    assertTrue(trouble.getMessage().contains("What was saved before is untouched"));
    assertEquals(saved, store.find(saved.id()).orElseThrow());
  }
}
