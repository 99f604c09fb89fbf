package spanwright.store;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.time.temporal.ChronoUnit;
import java.util.HexFormat;
import java.util.Optional;
import spanwright.plan.Json;

/**
 * A file that holds one JSON object.
 *
 * @param json its text
 * @param tree the same, read
 * @param version changes with every write; opaque, without quotes
 * @param savedAt when it was last written
 */
record JsonFile(String json, JsonNode tree, String version, Instant savedAt) {
  static final String ENDING = ".json";

  /** Anything longer was not written by this program. */
  private static final long LONGEST = 32L << 20;

  private static final DateTimeFormatter STAMP =
      DateTimeFormatter.ofPattern("yyyyMMdd'T'HHmmss'Z'").withZone(ZoneOffset.UTC);

  /** Empty when the bytes are not one JSON object in UTF-8. */
  static Optional<JsonFile> read(Path path) throws IOException {
    if (Files.size(path) > LONGEST) {
      return Optional.empty();
    }
    byte[] bytes = Files.readAllBytes(path);
    Instant time = timeOf(path);
    try {
      String json = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
      JsonNode tree = Json.mapper().readTree(json);
      return tree.isObject()
          ? Optional.of(new JsonFile(json, tree, version(bytes, time), time))
          : Optional.empty();
    } catch (CharacterCodingException | JsonProcessingException e) {
      return Optional.empty();
    }
  }

  static Instant timeOf(Path path) throws IOException {
    return Files.getLastModifiedTime(path).toInstant().truncatedTo(ChronoUnit.MILLIS);
  }

  /** The file's own time is part of the version, so it rises even when the clock does not. */
  static Instant timeAfter(Instant last) {
    Instant now = Instant.now().truncatedTo(ChronoUnit.MILLIS);
    if (last == null || now.isAfter(last)) {
      return now;
    }
    return last.truncatedTo(ChronoUnit.MILLIS).plusMillis(1);
  }

  static String version(byte[] bytes, Instant time) {
    try {
      byte[] digest = MessageDigest.getInstance("SHA-256").digest(bytes);
      return HexFormat.of().formatHex(digest, 0, 8)
          + "-"
          + Long.toString(time.toEpochMilli(), Character.MAX_RADIX);
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }

  /** Renames a file that shall no longer count: {@code NAME.WHY-TIME.json}, which is free. */
  static Path setAside(Path file, String why) throws IOException {
    String name = file.getFileName().toString();
    String stem =
        name.substring(0, name.length() - ENDING.length())
            + "."
            + why
            + "-"
            + STAMP.format(Instant.now());
    Path named = file.resolveSibling(stem + ENDING);
    for (int n = 2; Files.exists(named, LinkOption.NOFOLLOW_LINKS); n++) {
      named = file.resolveSibling(stem + "-" + n + ENDING);
    }
    Disk.rename(file, named);
    return named;
  }
}
