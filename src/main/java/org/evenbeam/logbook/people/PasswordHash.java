package org.evenbeam.logbook.people;

/**
 * An Argon2id hash (RFC 9106) with its parameters and salt, in the usual encoded form.
 *
 * @param encoded such as {@code $argon2id$v=19$m=19456,t=2,p=1$…$…}
 */
public record PasswordHash(String encoded) {
  @Override
  public String toString() {
    return "PasswordHash";
  }
}
