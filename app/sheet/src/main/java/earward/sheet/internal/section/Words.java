package earward.sheet.internal.section;

import earward.sheet.wording.Numbers;
import earward.sheet.wording.Wording;

/**
 * What every section needs to put content into words.
 *
 * @param wording of the sheet's language
 * @param numbers of the same
 */
public record Words(Wording wording, Numbers numbers) {
  /** The words of a language. */
  public static Words of(Wording wording) {
    return new Words(wording, new Numbers(wording.locale()));
  }

  /** The words of a key. */
  public String text(String key, String... namesAndValues) {
    return wording.text(key, namesAndValues);
  }
}
