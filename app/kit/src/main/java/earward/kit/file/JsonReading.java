package earward.kit.file;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import java.io.IOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Reads JSON into a tree, with a limit on depth so that no file can overrun the stack. */
final class JsonReading {
  private static final int DEEPEST = 60;
  private static final int LONGEST_NUMBER_CHARACTERS = 100;
  private static final JsonFactory FACTORY =
      JsonFactory.builder()
          .streamReadConstraints(
              StreamReadConstraints.builder().maxNumberLength(LONGEST_NUMBER_CHARACTERS).build())
          .build();

  private final String fileName;
  private final JsonParser parser;

  private JsonReading(String fileName, JsonParser parser) {
    this.fileName = fileName;
    this.parser = parser;
  }

  /**
   * The tree of a whole text.
   *
   * @throws DesignFileException where it is empty, broken, or nested too deeply
   */
  static Json read(String text, String fileName) throws DesignFileException {
    String body = text.startsWith("\ufeff") ? text.substring(1) : text;
    if (body.isBlank()) {
      throw DesignFileException.of(
          "empty-file", fileName, Json.Place.NOWHERE, "the file is empty; wanted a JSON object");
    }
    try (JsonParser parser = FACTORY.createParser(body)) {
      return new JsonReading(fileName, parser).whole();
    } catch (JsonProcessingException e) {
      throw DesignFileException.of(
          "broken-json", fileName, place(e.getLocation()), said(e.getOriginalMessage()));
    } catch (IOException e) {
      throw new IllegalStateException("a text in memory could not be read", e);
    }
  }

  private Json whole() throws IOException, DesignFileException {
    try {
      Json tree = value(parser.nextToken(), 1);
      if (parser.nextToken() != null) {
        throw broken("more follows after the end of the JSON object", place());
      }
      return tree;
    } catch (StreamConstraintsException e) {
      throw DesignFileException.of(
          "too-long",
          fileName,
          place(parser.currentLocation()),
          "a text or number here is of unusual length (a number has at most "
              + LONGEST_NUMBER_CHARACTERS
              + " digits); shorten it");
    }
  }

  /** The tree of a text that this program kept, known to be sound. */
  static Json kept(String text) {
    try {
      return read(text, "kept");
    } catch (DesignFileException e) {
      throw new IllegalArgumentException("'" + text + "' is no JSON: " + e.sentence(), e);
    }
  }

  private Json value(JsonToken token, int depth) throws IOException, DesignFileException {
    Json.Place place = place();
    if (depth > DEEPEST) {
      throw DesignFileException.of(
          "nested-too-deep",
          fileName,
          place,
          "lists and objects are nested deeper than " + DEEPEST + " levels; wanted fewer");
    }
    return switch (token) {
      case START_OBJECT -> members(place, depth);
      case START_ARRAY -> items(place, depth);
      case VALUE_STRING -> new Json.Scalar(true, parser.getText(), place);
      case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT, VALUE_TRUE, VALUE_FALSE, VALUE_NULL ->
          new Json.Scalar(false, parser.getText(), place);
      case END_OBJECT, END_ARRAY, FIELD_NAME, VALUE_EMBEDDED_OBJECT, NOT_AVAILABLE ->
          throw broken("a value is wanted here", place);
    };
  }

  private Json.Members members(Json.Place place, int depth)
      throws IOException, DesignFileException {
    Map<String, Json.Place> places = new HashMap<>();
    List<Json.Member> members = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_OBJECT) {
      String name = parser.currentName();
      requireNew(places, name);
      members.add(new Json.Member(name, value(parser.nextToken(), depth + 1)));
    }
    return new Json.Members(members, place);
  }

  private void requireNew(Map<String, Json.Place> places, String name) throws DesignFileException {
    Json.Place former = places.put(name, place());
    if (former != null) {
      throw DesignFileException.of(
          "duplicate-key",
          fileName,
          place(),
          "'" + name + "' stands here and in line " + former.line() + "; wanted once: remove one");
    }
  }

  private Json.Items items(Json.Place place, int depth) throws IOException, DesignFileException {
    List<Json> items = new ArrayList<>();
    for (JsonToken token = parser.nextToken();
        token != JsonToken.END_ARRAY;
        token = parser.nextToken()) {
      items.add(value(token, depth + 1));
    }
    return new Json.Items(items, place);
  }

  private Json.Place place() {
    return place(parser.currentTokenLocation());
  }

  private static Json.Place place(JsonLocation location) {
    return location == null
        ? Json.Place.NOWHERE
        : new Json.Place(location.getLineNr(), location.getColumnNr());
  }

  private DesignFileException broken(String what, Json.Place place) {
    return DesignFileException.of(
        "broken-json", fileName, place, "the JSON is broken: " + what + "; correct the file there");
  }

  private static String said(String message) {
    String first =
        message
            .lines()
            .findFirst()
            .orElse("")
            .replaceAll("\\[Source: [^\\]]*line: (\\d+), column: (\\d+)\\]", "line $1, column $2")
            .strip();
    return "the JSON is broken: " + first + "; correct the file there";
  }
}
