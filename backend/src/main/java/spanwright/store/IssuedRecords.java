package spanwright.store;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import spanwright.plan.Json;

/**
 * Which sheets were handed out of each plan. A record only ever grows: sheets are added to its end
 * and none is changed. It outlives the deletion of its plan.
 *
 * <p>Every record lies in the folder twice, the second copy written first. A letter that people
 * hold on paper must not be given again, so what stands in for a damaged record has to be the whole
 * of it, not the one before.
 */
public final class IssuedRecords {
  private static final String FORMAT = "spanwright-issued/1";

  /** The version of a record that has no sheet yet. */
  private static final String NONE = "none";

  private final PlanStore store;

  IssuedRecords(PlanStore store) {
    this.store = store;
  }

  /** The record of a plan: without sheets when none was issued, or when the id is unsound. */
  public IssuedRecord of(String id) {
    synchronized (store) {
      return PlanIds.isSound(id) ? view(sound(id)) : view(Optional.empty());
    }
  }

  /** Looks whether a record is sound when the folder is opened; one in trouble is mentioned. */
  void look(String id) {
    try {
      of(id);
    } catch (StoreTrouble e) {
      store.notice(e.getMessage());
    }
  }

  /**
   * Adds a sheet to the end of a plan's record, if that has not grown since; the two are one step.
   *
   * @param sheet an object with {@code revision}, which no earlier one has, {@code date} and {@code
   *     facts}
   * @param version of the record the sheet was made for
   * @return the record with it, or empty when there is no such plan
   * @throws StaleVersion when another sheet was issued meanwhile; nothing is written
   */
  public Optional<IssuedRecord> add(String id, JsonNode sheet, String version) {
    synchronized (store) {
      if (store.find(id).isEmpty()) {
        return Optional.empty();
      }
      Optional<JsonFile> old = sound(id);
      IssuedRecord before = view(old);
      if (!before.version().equals(version)) {
        throw new StaleVersion(id);
      }
      List<JsonNode> sheets = new ArrayList<>(before.sheets());
      sheets.add(sheet);
      write(id, sheets, old.map(JsonFile::savedAt).orElse(null));
      return Optional.of(of(id));
    }
  }

  /**
   * Gives a plan that was brought back under another id the record it had; not while the old one is
   * there, nor when the new one has a record.
   */
  public void carry(String from, String to) {
    synchronized (store) {
      IssuedRecord old = of(from);
      boolean gone = store.find(from).isEmpty() && store.find(to).isPresent();
      if (gone && !old.sheets().isEmpty() && of(to).sheets().isEmpty()) {
        write(to, old.sheets(), null);
      }
    }
  }

  private void write(String id, List<JsonNode> sheets, Instant last) {
    ObjectNode record = Json.mapper().createObjectNode();
    record.put("format", FORMAT);
    record.putArray("sheets").addAll(sheets);
    if (!isRecord(record)) {
      throw new IllegalArgumentException(
          "A sheet is issued with a revision of its own, a date and its facts.");
    }
    try {
      byte[] bytes =
          (Json.mapper().writerWithDefaultPrettyPrinter().writeValueAsString(record) + "\n")
              .getBytes(StandardCharsets.UTF_8);
      Instant time = JsonFile.timeAfter(last);
      for (Path target : List.of(copy(id), file(id))) {
        Disk.rename(Disk.writeBeside(target, bytes, time), target);
      }
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("the record of issued sheets could not be written", e);
    } catch (IOException e) {
      throw store.trouble("The record of sheets issued of " + id, "kept", e);
    }
  }

  /** A damaged record is set aside and the copy takes its place. */
  private Optional<JsonFile> sound(String id) {
    Path file = file(id);
    try {
      Optional<JsonFile> record = read(file);
      if (record.isPresent() || !Files.exists(file) && !Files.exists(copy(id))) {
        return record;
      }
      Optional<JsonFile> spare = read(copy(id));
      List<String> aside = new ArrayList<>();
      for (Path damaged : spare.isPresent() ? List.of(file) : List.of(file, copy(id))) {
        if (Files.exists(damaged)) {
          aside.add(JsonFile.setAside(damaged, "damaged").getFileName().toString());
        }
      }
      String words =
          "The record of sheets issued of "
              + id
              + (aside.isEmpty()
                  ? " was missing"
                  : " was damaged and is set aside as " + String.join(" and ", aside));
      if (spare.isEmpty()) {
        store.notice(words + ". The next sheet begins again at revision A: destroy older prints.");
        return Optional.empty();
      }
      byte[] bytes = spare.get().json().getBytes(StandardCharsets.UTF_8);
      Disk.rename(Disk.writeBeside(file, bytes, spare.get().savedAt()), file);
      store.notice(words + "; its copy has taken its place.");
      return read(file);
    } catch (IOException e) {
      throw store.trouble("The record of sheets issued of " + id, "read", e);
    }
  }

  private static Optional<JsonFile> read(Path path) throws IOException {
    return Files.isRegularFile(path)
        ? JsonFile.read(path).filter(file -> isRecord(file.tree()))
        : Optional.empty();
  }

  private static boolean isRecord(JsonNode tree) {
    if (!FORMAT.equals(tree.path("format").asText()) || !tree.path("sheets").isArray()) {
      return false;
    }
    Set<String> revisions = new HashSet<>();
    for (JsonNode sheet : tree.get("sheets")) {
      String revision = sheet.path("revision").asText();
      if (!revision.matches("[A-Z]{1,6}")
          || !revisions.add(revision)
          || !sheet.path("date").isTextual()
          || !areFacts(sheet.path("facts"))) {
        return false;
      }
    }
    return true;
  }

  private static boolean areFacts(JsonNode facts) {
    for (JsonNode fact : facts) {
      if (!fact.path("what").isTextual() || !fact.path("value").isTextual()) {
        return false;
      }
    }
    return facts.isArray();
  }

  private static IssuedRecord view(Optional<JsonFile> file) {
    List<JsonNode> sheets = new ArrayList<>();
    file.ifPresent(found -> found.tree().get("sheets").forEach(sheets::add));
    return new IssuedRecord(sheets, file.map(JsonFile::version).orElse(NONE));
  }

  private Path file(String id) {
    return store.folder().resolve(id + ".issued" + JsonFile.ENDING);
  }

  private Path copy(String id) {
    return store.folder().resolve(id + ".issued-copy" + JsonFile.ENDING);
  }
}
