package earward.kit.file;

import earward.block.quantity.Unit;
import earward.kit.design.AsWritten;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Function;

/** Reads the members of one object; each fault becomes one sentence with its place. */
final class MembersReader {
  private final Json.Members object;
  private final FileSource source;
  private final String what;
  private final Set<String> asked = new HashSet<>();
  private final Set<String> opened = new HashSet<>();

  /**
   * A reader of one object.
   *
   * @param what it is, for the sentences: {@code block 'volume'}
   */
  MembersReader(Json.Members object, FileSource source, String what) {
    this.object = object;
    this.source = source;
    this.what = what;
  }

  static MembersReader of(Json tree, FileSource source, String what) throws DesignFileException {
    if (tree instanceof Json.Members object) {
      return new MembersReader(object, source, what);
    }
    throw DesignFileException.of(
        "wrong-form", source.fileName(), tree.at(), what + " is no JSON object; wanted { ... }");
  }

  String what() {
    return what;
  }

  FileSource source() {
    return source;
  }

  String fileName() {
    return source.fileName();
  }

  Json.Members object() {
    return object;
  }

  Optional<Json> find(String name) {
    asked.add(name);
    return object.members().stream()
        .filter(member -> member.name().equals(name))
        .map(Json.Member::value)
        .findFirst();
  }

  Optional<Json.Scalar> scalar(String name) throws DesignFileException {
    Optional<Json> value = find(name);
    if (value.isEmpty()) {
      return Optional.empty();
    }
    if (value.get() instanceof Json.Scalar scalar && !scalar.isNull()) {
      return Optional.of(scalar);
    }
    throw fault("wrong-form", value.get(), name, "is no text or number");
  }

  Optional<String> text(String name) throws DesignFileException {
    return scalar(name).map(Json.Scalar::words);
  }

  String requiredText(String name) throws DesignFileException {
    return text(name).orElseThrow(() -> missing(name));
  }

  OptionalDouble quantity(String name, Unit unit) throws DesignFileException {
    Optional<Json.Scalar> scalar = scalar(name);
    return scalar.isPresent()
        ? OptionalDouble.of(quantity(name, scalar.get(), unit))
        : OptionalDouble.empty();
  }

  double quantity(String name, Unit unit, double usual) throws DesignFileException {
    return quantity(name, unit).orElse(usual);
  }

  double requiredQuantity(String name, Unit unit) throws DesignFileException {
    OptionalDouble value = quantity(name, unit);
    if (value.isEmpty()) {
      throw missing(name);
    }
    return value.getAsDouble();
  }

  private double quantity(String name, Json.Scalar scalar, Unit unit) throws DesignFileException {
    try {
      return QuantityText.parse(scalar.words(), unit);
    } catch (QuantityException e) {
      throw fault("quantity", scalar, name, "cannot be read: " + e.sentence());
    }
  }

  boolean flag(String name, boolean usual) throws DesignFileException {
    Optional<Json.Scalar> scalar = scalar(name);
    if (scalar.isEmpty()) {
      return usual;
    }
    String words = scalar.get().words();
    if (!scalar.get().quoted() && (words.equals("true") || words.equals("false"))) {
      return words.equals("true");
    }
    throw fault("unknown-choice", scalar.get(), name, "is '" + words + "'; wanted true or false");
  }

  <E extends Enum<E>> E choice(String name, E[] options, Function<E, String> key, E usual)
      throws DesignFileException {
    Optional<Json.Scalar> scalar = scalar(name);
    if (scalar.isEmpty()) {
      return usual;
    }
    for (E option : options) {
      if (key.apply(option).equals(scalar.get().words())) {
        return option;
      }
    }
    List<String> keys = List.of(options).stream().map(key).toList();
    throw fault(
        "unknown-choice",
        scalar.get(),
        name,
        "is '" + scalar.get().words() + "'; it can be " + String.join(", ", keys));
  }

  /** An object that is kept with its own words elsewhere, not in this one's. */
  Optional<MembersReader> openOwn(String name) throws DesignFileException {
    opened.add(name);
    return open(name);
  }

  Optional<MembersReader> open(String name) throws DesignFileException {
    Optional<Json> value = find(name);
    return value.isPresent()
        ? Optional.of(of(value.get(), source, "'" + name + "'"))
        : Optional.empty();
  }

  /** A list whose items are kept with their own words elsewhere. */
  List<Json> ownItems(String name) throws DesignFileException {
    opened.add(name);
    return items(name);
  }

  List<Json> items(String name) throws DesignFileException {
    Optional<Json> value = find(name);
    if (value.isEmpty()) {
      return List.of();
    }
    if (value.get() instanceof Json.Items array) {
      return array.items();
    }
    throw fault("wrong-form", value.get(), name, "is no list; wanted [ ... ]");
  }

  /** All members as plain texts, for objects whose member names are the user's own. */
  Map<String, Json.Scalar> allScalars() throws DesignFileException {
    Map<String, Json.Scalar> all = new LinkedHashMap<>();
    for (Json.Member member : object.members()) {
      all.put(member.name(), scalar(member.name()).orElseThrow(() -> missing(member.name())));
    }
    return all;
  }

  /** The object as it was written; what nothing asked for is noted, since it may be misspelt. */
  AsWritten written() {
    noteUnknown();
    Map<String, String> members = new LinkedHashMap<>();
    for (Json.Member member : object.members()) {
      members.put(
          member.name(), opened.contains(member.name()) ? "" : JsonWriting.line(member.value()));
    }
    return new AsWritten(members);
  }

  /** Notes every member that nothing asked for: it is kept, and has no effect. */
  void noteUnknown() {
    unasked().forEach(member -> source.noteUnknown(member, what));
  }

  /** The members that nothing asked for. */
  List<Json.Member> unasked() {
    return object.members().stream().filter(member -> !asked.contains(member.name())).toList();
  }

  DesignFileException missing(String name) {
    return DesignFileException.of(
        "missing-member", fileName(), object.at(), what + " has no member '" + name + "'; add it");
  }

  DesignFileException fault(String code, Json value, String name, String found) {
    return DesignFileException.of(
        code, fileName(), value.at(), "'" + name + "' of " + what + " " + found);
  }

  /** The whole object at fault, by a record's own sentence. */
  DesignFileException impossible(IllegalArgumentException e) {
    return DesignFileException.of(
        "impossible-value", fileName(), object.at(), what + ": " + e.getMessage());
  }
}
