package org.mastwright.report;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.time.LocalDate;
import java.util.Optional;
import org.mastwright.assess.Assessment;

/**
 * What identifies a printed document: no clock and no chance enter it.
 *
 * @param id from the input's hash and the program's version
 * @param date of the project, absent when it gives none
 * @param producer the program and its version
 */
record DocumentMark(long id, Optional<LocalDate> date, String producer) {
  static final DocumentMark NONE = new DocumentMark(0, Optional.empty(), "mastwright");

  static DocumentMark of(Assessment a) {
    String producer = "mastwright " + a.version();
    byte[] seed = (a.input().sha256() + "|" + a.version()).getBytes(StandardCharsets.UTF_8);
    try {
      byte[] digest = MessageDigest.getInstance("SHA-256").digest(seed);
      return new DocumentMark(
          ByteBuffer.wrap(digest).getLong(), a.design().project().date(), producer);
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }
}
