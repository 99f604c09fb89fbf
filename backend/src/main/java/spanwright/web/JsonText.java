package spanwright.web;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.io.JsonEOFException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.MissingNode;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import spanwright.plan.Fault;

/**
 * Reads JSON text into a tree, within bounds, and says in plain words where it is not JSON.
 *
 * <p>The bounds: nested at most 64 deep, numbers of at most 100 digits, names of at most 200
 * characters, at most two million brackets, names and values in all. A name may stand once in an
 * object, and nothing may follow the document.
 */
public final class JsonText {
  private static final int DEEPEST = 64;
  private static final int LONGEST_NUMBER = 100;
  private static final int LONGEST_NAME = 200;
  private static final int LONGEST_TEXT = 1_100_000;

  /** A tree of so many values and names takes about 100 MB. */
  private static final long MOST_TOKENS = 2_000_000;

  private static final JsonMapper MAPPER = new JsonMapper(factory(MOST_TOKENS));

  /** For looking through a text without building anything of it. */
  private static final JsonFactory SCANNER = factory(Long.MAX_VALUE);

  private static final Pattern CHARACTER = Pattern.compile("character \\((.*) \\(code");
  private static final Pattern QUOTED = Pattern.compile("(?:'([^']*)'|\"([^\"]*)\")");

  private JsonText() {}

  /** Decodes UTF-8 strictly. */
  public static String decode(byte[] bytes) throws BadJson {
    try {
      return StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
    } catch (CharacterCodingException e) {
      throw new BadJson(new Fault("", "The text is not UTF-8. Save it as UTF-8 and try again."));
    }
  }

  /** Reads one document. */
  public static JsonNode read(String text) throws BadJson {
    return parse(MAPPER.getFactory(), text, MAPPER::readTree);
  }

  /** Whether one document stands there and nothing else, without keeping it. */
  public static void scan(String text) throws BadJson {
    parse(
        SCANNER,
        text,
        parser -> {
          JsonToken first = parser.nextToken();
          parser.skipChildren();
          return first;
        });
  }

  private static JsonFactory factory(long mostTokens) {
    return JsonFactory.builder()
        .streamReadConstraints(
            StreamReadConstraints.builder()
                .maxNestingDepth(DEEPEST)
                .maxNumberLength(LONGEST_NUMBER)
                .maxNameLength(LONGEST_NAME)
                .maxStringLength(LONGEST_TEXT)
                .maxTokenCount(mostTokens)
                .build())
        .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
        .build();
  }

  /** One way of taking a document in. */
  private interface Taking<T> {
    T from(JsonParser parser) throws IOException;
  }

  private static <T> T parse(JsonFactory factory, String text, Taking<T> taking) throws BadJson {
    JsonLocation reached = null;
    // Some editors put a byte order mark in front.
    String json = text.startsWith("\uFEFF") ? text.substring(1) : text;
    try (JsonParser parser = factory.createParser(json)) {
      try {
        T taken = taking.from(parser);
        if (taken == null || taken instanceof MissingNode) {
          throw new BadJson(new Fault("", "There is no JSON in it: the text is empty."));
        }
        if (parser.nextToken() != null) {
          String more = "Something follows after the end of the document. Remove it.";
          throw new BadJson(new Fault(where(parser.currentTokenLocation()), more));
        }
        return taken;
      } finally {
        reached = parser.currentLocation();
      }
    } catch (JsonProcessingException e) {
      JsonLocation at = e.getLocation() == null ? reached : e.getLocation();
      throw new BadJson(new Fault(where(at), words(e)));
    } catch (IOException e) {
      throw new IllegalStateException("a text is read without any input", e);
    }
  }

  private static String where(JsonLocation at) {
    if (at == null || at.getLineNr() < 1) {
      return "";
    }
    return "line " + at.getLineNr() + ", column " + at.getColumnNr();
  }

  private static String words(JsonProcessingException e) {
    String inner = e.getOriginalMessage() == null ? "" : e.getOriginalMessage();
    if (e instanceof StreamConstraintsException) {
      return tooMuch(inner);
    }
    if (e instanceof JsonEOFException) {
      return "The text ends before the JSON does: a bracket, brace or quote is not closed.";
    }
    if (inner.startsWith("Duplicate field") || inner.startsWith("Duplicate Object property")) {
      return "The name " + quoted(inner) + " stands twice in the same object. Keep one.";
    }
    if (inner.startsWith("Non-standard token")) {
      return quoted(inner) + " is not a number in JSON. Give a finite number or leave it out.";
    }
    if (inner.startsWith("Unrecognized token")) {
      return "The word "
          + quoted(inner)
          + " is not JSON. Text stands in double quotes; besides it there are numbers, true, false"
          + " and null.";
    }
    Matcher found = CHARACTER.matcher(inner);
    if (found.find()) {
      return "The character " + found.group(1) + " cannot stand here in JSON.";
    }
    if (inner.startsWith("Illegal unquoted character")) {
      return "A text holds a control character, such as a line break. Write \\n or leave it out.";
    }
    if (inner.startsWith("Unexpected close marker")) {
      return "The bracket or brace " + quoted(inner) + " closes what was not opened.";
    }
    if (inner.startsWith("Invalid numeric value")) {
      return "This is not a number as JSON writes it.";
    }
    return "This is not JSON.";
  }

  private static String tooMuch(String inner) {
    if (inner.contains("nesting depth")) {
      return "Brackets are nested more than " + DEEPEST + " deep. No document here needs that.";
    }
    if (inner.contains("Number value length")) {
      return "A number has more than " + LONGEST_NUMBER + " digits. Shorten it.";
    }
    if (inner.contains("Name length")) {
      return "A name has more than " + LONGEST_NAME + " characters. Shorten it.";
    }
    if (inner.contains("String value length")) {
      return "A text has more than " + LONGEST_TEXT + " characters. Shorten it.";
    }
    return "The document holds more than " + MOST_TOKENS + " values and names. Make it smaller.";
  }

  /** The first thing in quotes, cut to a length that can be read, in double quotes. */
  private static String quoted(String inner) {
    Matcher found = QUOTED.matcher(inner);
    if (!found.find()) {
      return "here";
    }
    String text = found.group(1) == null ? found.group(2) : found.group(1);
    String cut = text.length() > 40 ? text.substring(0, 40) + "…" : text;
    return "\"" + cut + "\"";
  }
}
