package org.evenbeam.trail;

/**
 * An entry as it is kept: its canonical form and the hash of that.
 *
 * @param number the entry's number
 * @param form the version of the canonical form
 * @param canonical the canonical form, JSON by RFC 8785
 * @param hash SHA-256 of the canonical form's UTF-8 bytes, 64 hexadecimal digits
 */
public record SealedEntry(long number, int form, String canonical, String hash) {}
