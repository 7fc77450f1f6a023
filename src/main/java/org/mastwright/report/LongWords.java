package org.mastwright.report;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Lets very long words of the user break, so that no column is pushed off the page: soft hyphens
 * are put into them. Hashes are left whole, since they are copied by hand.
 */
final class LongWords {
  private static final Pattern MARKUP =
      Pattern.compile("<style.*?</style>|<[^>]*>", Pattern.DOTALL);
  private static final Pattern LONG = Pattern.compile("[^\\s<>&;]{31,}");
  private static final Pattern HASH = Pattern.compile("[0-9a-f]{64}");
  private static final Pattern PIECE = Pattern.compile("(.{12})(?=.)");

  private LongWords() {}

  /** The document with break places in the long words of its text. */
  static String breakable(String xhtml) {
    StringBuilder out = new StringBuilder(xhtml.length());
    Matcher markup = MARKUP.matcher(xhtml);
    int at = 0;
    while (markup.find()) {
      out.append(text(xhtml.substring(at, markup.start()))).append(markup.group());
      at = markup.end();
    }
    return out.append(text(xhtml.substring(at))).toString();
  }

  private static String text(String words) {
    return LONG.matcher(words).replaceAll(m -> Matcher.quoteReplacement(broken(m.group())));
  }

  private static String broken(String word) {
    return HASH.matcher(word).matches() ? word : PIECE.matcher(word).replaceAll("$1\u00AD");
  }
}
