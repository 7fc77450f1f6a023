package org.mastwright.file;

import java.util.List;

/** Small numbers in words. */
final class Plain {
  private static final List<String> WORDS =
      List.of("no", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine");

  private Plain() {}

  static String number(int n) {
    return n >= 0 && n < WORDS.size() ? WORDS.get(n) : Integer.toString(n);
  }
}
