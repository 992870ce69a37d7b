package org.fallwright.core.revision;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Set;

/**
 * A word of four letters by which people tell over a radio whether they hold the same sheet:
 * consonant, vowel, consonant, vowel, taken from a hash of what the sheet says. 3,600 words less
 * those that mean something; two different sheets have the same word once in so many times.
 */
public final class CheckWord {
  /** Consonants that are not taken for one another over a radio, in English and Spanish. */
  private static final String CONSONANTS = "BDFGLMNRSTVZ";

  private static final String VOWELS = "AEIOU";

  /** Words that mean something that nobody wants on a sheet. */
  private static final Set<String> NEVER =
      Set.of(
          "BOBA", "BOBO", "DAGO", "FEDO", "GAGA", "MALA", "MALO", "NADA", "SIDA", "TETA", "TETO");

  private CheckWord() {}

  /** The word of a text. */
  public static String of(String text) {
    byte[] hash = sha256(text);
    for (int i = 0; i + 4 <= hash.length; i += 4) {
      String word =
          letter(CONSONANTS, hash[i])
              + letter(VOWELS, hash[i + 1])
              + letter(CONSONANTS, hash[i + 2])
              + letter(VOWELS, hash[i + 3]);
      if (!NEVER.contains(word)) {
        return word;
      }
    }
    return of(text + " ");
  }

  private static String letter(String letters, byte b) {
    return String.valueOf(letters.charAt(Byte.toUnsignedInt(b) % letters.length()));
  }

  private static byte[] sha256(String text) {
    try {
      return MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }
}
