package spanwright.plan;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.io.JsonEOFException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CoderResult;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Text to a JSON tree, within bounds that keep any text quick to refuse: size, depth, length of
 * numbers, number of values. Lists are kept up to {@link #KEPT} entries and only counted beyond.
 * Faults say line and column in plain words.
 */
final class JsonText {
  static final int BYTES = 8 * 1024 * 1024;
  static final int DEPTH = 30;
  static final int KEPT = 6000;
  static final int VALUES = 500_000;
  private static final int DIGITS = 200;
  private static final int CHARACTERS = 2_000_000;
  private static final Pattern ODD_CHARACTER = Pattern.compile("Unexpected character \\('(.)'");
  private static final Pattern ODD_TOKEN =
      Pattern.compile("(?:Unrecognized|Non-standard) token '(-?[^']*)'");
  private static final Pattern ODD_MARKER = Pattern.compile("Unexpected close marker '(.)'");
  private static final JsonFactory FACTORY =
      JsonFactory.builder()
          .streamReadConstraints(
              StreamReadConstraints.builder()
                  .maxNestingDepth(DEPTH)
                  .maxNumberLength(DIGITS)
                  .maxStringLength(CHARACTERS)
                  .maxNameLength(10_000)
                  .build())
          .build();

  private final JsonParser parser;
  private final List<Fault> faults = new ArrayList<>();
  private final Map<JsonNode, Integer> lengths = new IdentityHashMap<>();
  private final Set<String> twice = new HashSet<>();
  private int values;

  private JsonText(JsonParser parser) {
    this.parser = parser;
  }

  /**
   * What parsing gave.
   *
   * @param root null when the text cannot be made out
   * @param faults of syntax, and fields there twice
   * @param lengths the true length of each list that was too long to keep
   */
  record Parsed(JsonNode root, List<Fault> faults, Map<JsonNode, Integer> lengths) {}

  /** Where a fault of syntax lies, thrown to stop parsing. */
  private static final class Stop extends RuntimeException {
    private final Wording wording;
    private final Object[] parts;

    Stop(Wording wording, Object... parts) {
      super(null, null, false, false);
      this.wording = wording;
      this.parts = parts;
    }
  }

  /** Parses UTF-8. */
  static Parsed parse(byte[] utf8) {
    if (utf8.length > BYTES) {
      return refused("", Wording.TOO_BIG, utf8.length, BYTES);
    }
    ByteBuffer in = ByteBuffer.wrap(utf8);
    var decoder = StandardCharsets.UTF_8.newDecoder();
    try {
      return parse(decoder.decode(in).toString());
    } catch (CharacterCodingException e) {
      // again from the start: the convenience method does not say where it stopped
      in.rewind();
      decoder.reset();
      java.nio.CharBuffer out = java.nio.CharBuffer.allocate(utf8.length + 1);
      CoderResult result = decoder.decode(in, out, true);
      out.flip();
      long line = 1 + out.chars().filter(c -> c == '\n').count();
      return result.isError()
          ? refused("line " + line, Wording.NOT_UTF8)
          : refused("", Wording.NOT_UTF8);
    }
  }

  /** Parses text. */
  static Parsed parse(String text) {
    if (text.length() > BYTES) {
      return refused("", Wording.TOO_BIG, text.length(), BYTES);
    }
    String json = text.startsWith("\uFEFF") ? text.substring(1) : text;
    if (json.isBlank()) {
      return refused("", Wording.EMPTY);
    }
    try (JsonParser parser = FACTORY.createParser(json)) {
      return new JsonText(parser).document();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static Parsed refused(String path, Wording wording, Object... parts) {
    return new Parsed(null, List.of(Fault.of(path, wording, parts)), Map.of());
  }

  private Parsed document() throws IOException {
    try {
      parser.nextToken();
      JsonNode root = value("");
      if (parser.nextToken() != null) {
        throw new Stop(Wording.FOLLOWS_THE_END);
      }
      return new Parsed(root, faults, lengths);
    } catch (Stop stop) {
      faults.add(Fault.of(place(parser.currentTokenLocation()), stop.wording, stop.parts));
    } catch (JsonProcessingException e) {
      JsonLocation at = e.getLocation() == null ? parser.currentLocation() : e.getLocation();
      faults.add(inPlainWords(e, place(at)));
    }
    return new Parsed(null, faults, lengths);
  }

  private JsonNode value(String path) throws IOException {
    if (++values > VALUES) {
      throw new Stop(Wording.TOO_MUCH, VALUES);
    }
    JsonNodeFactory make = JsonNodeFactory.instance;
    return switch (parser.currentToken()) {
      case START_OBJECT -> object(path);
      case START_ARRAY -> list(path);
      case VALUE_STRING -> make.textNode(parser.getText());
      case VALUE_NUMBER_INT -> whole();
      case VALUE_NUMBER_FLOAT -> make.numberNode(parser.getDoubleValue());
      case VALUE_TRUE -> make.booleanNode(true);
      case VALUE_FALSE -> make.booleanNode(false);
      default -> make.nullNode();
    };
  }

  private JsonNode whole() throws IOException {
    return parser.getNumberType() == JsonParser.NumberType.INT
        ? JsonNodeFactory.instance.numberNode(parser.getIntValue())
        : JsonNodeFactory.instance.numberNode(parser.getDoubleValue());
  }

  private ObjectNode object(String path) throws IOException {
    ObjectNode object = JsonNodeFactory.instance.objectNode();
    while (parser.nextToken() != JsonToken.END_OBJECT) {
      String name = parser.currentName();
      String inner = Paths.field(path, name);
      parser.nextToken();
      if (object.has(name) && twice.add(inner)) {
        faults.add(Fault.of(inner, Wording.TWICE, Wording.clean(name)));
      }
      object.set(name, value(inner));
    }
    return object;
  }

  private ArrayNode list(String path) throws IOException {
    ArrayNode list = JsonNodeFactory.instance.arrayNode();
    int length = 0;
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      if (length < KEPT) {
        list.add(value(Paths.entry(path, length)));
      } else {
        parser.skipChildren();
      }
      length++;
    }
    if (length > KEPT) {
      lengths.put(list, length);
    }
    return list;
  }

  private static String place(JsonLocation at) {
    return "line " + at.getLineNr() + ", column " + at.getColumnNr();
  }

  /** The parser's own text names its classes and settings; it is read only to sort the fault. */
  private static Fault inPlainWords(JsonProcessingException e, String at) {
    String said = String.valueOf(e.getOriginalMessage());
    if (e instanceof JsonEOFException) {
      return Fault.of(at, Wording.ENDS_EARLY);
    }
    if (e instanceof StreamConstraintsException) {
      return said.contains("nesting depth")
          ? Fault.of(at, Wording.TOO_DEEP, DEPTH)
          : said.startsWith("Number")
              ? Fault.of(at, Wording.TOO_LONG_A_NUMBER, DIGITS)
              : Fault.of(at, Wording.TOO_LONG_A_TEXT, CHARACTERS);
    }
    Matcher token = ODD_TOKEN.matcher(said);
    if (token.find()) {
      boolean number = token.group(1).matches("-?(NaN|INF|Infinity)");
      return Fault.of(
          at,
          number ? Wording.NOT_A_JSON_NUMBER : Wording.NOT_A_VALUE,
          Wording.clean(token.group(1)));
    }
    Matcher marker = ODD_MARKER.matcher(said);
    if (marker.find()) {
      return Fault.of(at, Wording.WRONG_BRACKET, marker.group(1));
    }
    Matcher odd = ODD_CHARACTER.matcher(said);
    String found = odd.find() ? Wording.clean(odd.group(1)) : "something odd";
    return Fault.of(at, sorted(said, found), found);
  }

  private static Wording sorted(String said, String found) {
    if (said.contains("comment")) {
      return Wording.NO_COMMENTS;
    }
    if (said.contains("to separate") && said.contains("comma")) {
      return Wording.COMMA_EXPECTED;
    }
    if (said.contains("double-quote to start field name")) {
      return Wording.NAME_EXPECTED;
    }
    if (said.contains("colon to separate")) {
      return Wording.COLON_EXPECTED;
    }
    if (said.contains("numeric value") || said.contains("Decimal point") || said.contains("+INF")) {
      return Wording.MISWRITTEN_NUMBER;
    }
    if (said.contains("expected a valid value") || said.contains("expected a value")) {
      return "+.".contains(found) ? Wording.MISWRITTEN_NUMBER : Wording.VALUE_EXPECTED;
    }
    if (said.contains("unquoted character")) {
      return Wording.BROKEN_TEXT;
    }
    return said.contains("escape") ? Wording.BAD_ESCAPE : Wording.NOT_JSON;
  }
}
