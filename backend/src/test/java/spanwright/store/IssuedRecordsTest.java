package spanwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanwright.plan.Json;

/** What the folder promises of sheets that were handed out. */
class IssuedRecordsTest {
  private static final String GARDEN = "{\"title\":\"Back garden\"}";

  @TempDir Path folder;
  private PlanStore store;
  private String id;

  @BeforeEach
  void open() {
    store = PlanStore.open(folder);
    id = store.create(GARDEN).id();
  }

  @AfterEach
  void close() {
    store.close();
  }

  private void reopen() {
    store.close();
    store = PlanStore.open(folder);
  }

  private static ObjectNode sheet(String revision) {
    ObjectNode sheet = Json.mapper().createObjectNode();
    sheet.put("revision", revision).put("date", "2026-05-14").put("placement", "p01");
    sheet.putArray("facts").addObject().put("what", "Wire W1, cut").put("value", "10.25 m");
    return sheet;
  }

  private IssuedRecord add(String revision) {
    return store.issued().add(id, sheet(revision), store.issued().of(id).version()).orElseThrow();
  }

  private static List<String> letters(IssuedRecord record) {
    return record.sheets().stream().map(each -> each.get("revision").asText()).toList();
  }

  private List<String> letters() {
    return letters(store.issued().of(id));
  }

  private Path file() {
    return folder.resolve(id + ".issued.json");
  }

  private Path copy() {
    return folder.resolve(id + ".issued-copy.json");
  }

  private List<String> files(String pattern) throws IOException {
    try (Stream<Path> all = Files.list(folder)) {
      return all.map(path -> path.getFileName().toString())
          .filter(name -> name.matches(pattern))
          .sorted()
          .toList();
    }
  }

  @Test
  void sheets_are_kept_in_order_and_found_again() {
    assertTrue(store.issued().of(id).sheets().isEmpty());
    add("A");
    IssuedRecord both = add("B");
    reopen();
    assertEquals(List.of("A", "B"), letters());
    assertEquals(both, store.issued().of(id));
    assertEquals(sheet("A"), both.sheets().get(0));
    assertEquals(1, store.list().size(), "a record is no plan");
    assertTrue(store.notices().isEmpty(), store.notices().toString());
  }

  @Test
  void of_many_who_saw_the_same_record_one_alone_adds_to_it() throws Exception {
    String seen = add("A").version();
    ExecutorService threads = Executors.newFixedThreadPool(8);
    List<Callable<Boolean>> rivals = new ArrayList<>();
    for (int i = 0; i < 16; i++) {
      rivals.add(
          () -> {
            try {
              return store.issued().add(id, sheet("B"), seen).isPresent();
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
    assertEquals(List.of("A", "B"), letters());
  }

  @Test
  void a_letter_is_never_kept_twice() {
    add("A");
    assertThrows(IllegalArgumentException.class, () -> add("A"));
    assertThrows(IllegalArgumentException.class, () -> add("a"));
    assertEquals(List.of("A"), letters());
  }

  @Test
  void a_damaged_record_is_set_aside_and_none_of_its_sheets_is_lost() throws IOException {
    add("A");
    add("B");
    for (String rubbish : List.of("", "{\"format\":\"spanwright-issued/1\",\"sheets\":[{}]}")) {
      Files.writeString(file(), rubbish);
      reopen();
      assertEquals(List.of("A", "B"), letters());
      String aside = files(id + "\\.issued\\.damaged-.*").get(0);
      assertTrue(store.notices().get(0).contains(aside), store.notices().toString());
    }
    assertEquals(2, files(id + "\\.issued\\.damaged-.*").size());
    Files.delete(file());
    assertEquals(List.of("A", "B"), letters());
    Files.writeString(copy(), "rubbish");
    add("C");
    Files.delete(file());
    assertEquals(List.of("A", "B", "C"), letters());
  }

  @Test
  void a_record_lost_for_good_says_that_letters_begin_again() throws IOException {
    add("A");
    Files.writeString(file(), "rubbish");
    Files.writeString(copy(), "rubbish");
    assertTrue(letters().isEmpty());
    assertEquals(2, files(id + "\\.issued.*damaged-.*").size());
    assertTrue(store.notices().get(0).contains("begins again at revision A"));
    assertTrue(letters().isEmpty());
    assertEquals(1, store.notices().size());
    add("A");
    assertEquals(List.of("A"), letters());
  }

  @Test
  void the_record_outlives_its_plan_and_goes_with_it_when_that_is_brought_back() {
    add("A");
    store.delete(id, v -> true);
    assertTrue(store.issued().add(id, sheet("B"), store.issued().of(id).version()).isEmpty());
    String again = store.create(GARDEN).id();
    assertFalse(again.equals(id), "an id with a record is not given again");
    assertTrue(store.issued().of(again).sheets().isEmpty());
    store.issued().carry(id, again);
    assertEquals(List.of("A"), letters(store.issued().of(again)));
    store.issued().add(again, sheet("B"), store.issued().of(again).version());
    store.issued().carry(id, again);
    assertEquals(List.of("A", "B"), letters(store.issued().of(again)));
    assertEquals(List.of("A"), letters());
  }

  @Test
  void an_unsound_id_never_becomes_a_path() throws IOException {
    Files.writeString(folder.resolve("a..b.issued.json"), "rubbish");
    for (String odd : List.of("..", "../a", "a..b", "A", "a/b", "")) {
      assertTrue(store.issued().of(odd).sheets().isEmpty());
      assertTrue(store.issued().add(odd, sheet("A"), "none").isEmpty());
      store.issued().carry(odd, id);
      store.issued().carry(id, odd);
    }
    assertEquals(List.of(), files(".*damaged.*"));
    assertTrue(letters().isEmpty());
  }

  @Test
  void a_disk_that_refuses_says_so_and_the_record_stays() throws IOException {
    IssuedRecord before = add("A");
    Files.createDirectory(folder.resolve(id + ".issued.json.tmp"));
    StoreTrouble trouble = assertThrows(StoreTrouble.class, () -> add("B"));
    assertTrue(trouble.getMessage().contains("untouched"), trouble.getMessage());
    assertEquals(before, store.issued().of(id));
  }
}
