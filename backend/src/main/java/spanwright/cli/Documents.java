package spanwright.cli;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.time.LocalDate;
import java.util.List;
import spanwright.plan.Json;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;
import spanwright.web.BadJson;
import spanwright.web.Finite;
import spanwright.web.JsonText;

/** Files in and out, with a sentence for each way that can fail. */
final class Documents {
  static final long LONGEST_CASE = 8L << 20;
  static final long LONGEST_RESULT = 64L << 20;

  private Documents() {}

  /** A plan file, complete and without a fault. */
  static Plan plan(String name) {
    Path file = path(name);
    PlanReader.Outcome outcome = PlanReader.read(text(file, LONGEST_CASE), LocalDate.now());
    if (!outcome.faults().isEmpty()) {
      throw Failure.badInput(file, outcome.faults());
    }
    return outcome.plan();
  }

  /** Any JSON file as a tree. */
  static JsonNode tree(Path file, long longest) {
    try {
      return JsonText.read(text(file, longest));
    } catch (BadJson e) {
      throw Failure.badInput(file, List.of(e.fault()));
    }
  }

  static Path path(String name) {
    try {
      return Path.of(name);
    } catch (InvalidPathException e) {
      throw Failure.badInput(name + ": this cannot be the name of a file. Check the path.");
    }
  }

  private static String text(Path file, long longest) {
    try {
      if (Files.isDirectory(file)) {
        throw Failure.badInput(file + ": this is a folder. Name a file in it.");
      }
      if (Files.size(file) > longest) {
        throw Failure.badInput(
            file + ": the file is larger than " + (longest >> 20) + " MB. Make it smaller.");
      }
      return JsonText.decode(Files.readAllBytes(file));
    } catch (BadJson e) {
      throw Failure.badInput(file, List.of(e.fault()));
    } catch (NoSuchFileException e) {
      throw Failure.badInput(file + ": there is no such file. Check the path.");
    } catch (AccessDeniedException e) {
      throw Failure.badInput(file + ": the file may not be read. Check its permissions.");
    } catch (IOException e) {
      throw Failure.badInput(file + ": the file cannot be read. Check that it is a plain file.");
    }
  }

  /** A document as text, every number in it finite. */
  static String json(Object document) {
    try {
      JsonNode tree = Finite.tree(document);
      return Json.mapper().writerWithDefaultPrettyPrinter().writeValueAsString(tree) + "\n";
    } catch (JsonProcessingException e) {
      throw new IllegalStateException(e);
    }
  }

  /** Before any work: whether the file could be written, said now rather than after a minute. */
  static Path target(String name) {
    if (name == null) {
      return null;
    }
    Path file = path(name);
    Path folder = file.toAbsolutePath().getParent();
    if (Files.isDirectory(file)) {
      throw Failure.couldNot(file + ": this is a folder. Give --out the name of a file.");
    }
    if (folder == null || !Files.isDirectory(folder)) {
      throw Failure.couldNot(
          file + ": there is no folder " + folder + " to write into. Make it, or change --out.");
    }
    if (!Files.isWritable(folder)) {
      throw Failure.couldNot(
          file + ": the folder " + folder + " may not be written. Choose another with --out.");
    }
    return file;
  }

  /** To the file when there is one, else to standard output. */
  static void write(Console console, Path file, String text) {
    if (file == null) {
      console.out().print(text);
      console.out().flush();
    } else {
      write(file, text.getBytes(StandardCharsets.UTF_8));
    }
  }

  /** Whole or not at all. */
  static void write(Path file, byte[] bytes) {
    Path whole = file.toAbsolutePath();
    Path beside = null;
    try {
      if (Files.exists(whole) && !Files.isRegularFile(whole)) {
        Files.write(whole, bytes);
        return;
      }
      beside = whole.resolveSibling("." + whole.getFileName() + ".tmp");
      Files.write(beside, bytes);
      Files.move(beside, whole, StandardCopyOption.REPLACE_EXISTING);
    } catch (IOException e) {
      throw Failure.couldNot(
          file + ": the file cannot be written. Check the folder's permissions and free space.");
    } finally {
      deleteQuietly(beside);
    }
  }

  private static void deleteQuietly(Path beside) {
    try {
      if (beside != null) {
        Files.deleteIfExists(beside);
      }
    } catch (IOException e) {
      // A left-over temporary file harms nobody.
    }
  }
}
