package spanwright.cli;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.type.TypeReference;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Json;
import spanwright.sheet.Issued;
import spanwright.sheet.SheetModel;

/**
 * The sheets a folder has been given, so that the next one knows which revision it is and what it
 * changes. Files of an older revision are never written over: later ones carry their letter.
 */
final class IssuedSheets {
  private static final String RECORD = "issued-sheets.json";

  private final Path record;
  private final List<Issued> list;

  private IssuedSheets(Path record, List<Issued> list) {
    this.record = record;
    this.list = list;
  }

  static IssuedSheets in(Path folder) {
    Path record = folder.resolve(RECORD);
    if (!Files.exists(record)) {
      return new IssuedSheets(record, List.of());
    }
    try {
      List<Issued> list =
          Json.mapper().readValue(Files.readString(record), new TypeReference<List<Issued>>() {});
      boolean sound =
          list != null
              && list.stream()
                  .allMatch(
                      i -> i != null && i.revision() != null && i.revision().matches("[A-Z]{1,6}"));
      if (!sound) {
        throw damaged(record);
      }
      return new IssuedSheets(record, list);
    } catch (IOException e) {
      throw damaged(record);
    }
  }

  private static RuntimeException damaged(Path record) {
    return Failure.badInput(
        record
            + ": this record of the sheets issued before cannot be read. Move it away to begin again"
            + " at revision A, or give another folder with --dir.");
  }

  List<Issued> list() {
    return list;
  }

  /** Name of the files of a sheet, without its ending. */
  String stem(SheetModel model) {
    String stem = "sheet-" + model.head().placement().replaceAll("[^A-Za-z0-9]+", "-");
    String revision = model.head().revision();
    return revision.equals("A") ? stem : stem + "-" + revision;
  }

  /** Adds a sheet to the record, unless it is the one issued last. */
  void keep(Issued sheet) {
    if (!list.isEmpty() && list.get(list.size() - 1).revision().equals(sheet.revision())) {
      return;
    }
    List<Issued> longer = new ArrayList<>(list);
    longer.add(sheet);
    try {
      String text = Json.mapper().writerWithDefaultPrettyPrinter().writeValueAsString(longer);
      Documents.write(record, (text + "\n").getBytes(StandardCharsets.UTF_8));
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("the record of issued sheets could not be written", e);
    }
  }
}
