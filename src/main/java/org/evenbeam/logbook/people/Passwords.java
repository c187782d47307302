package org.evenbeam.logbook.people;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.SecureRandom;
import java.util.Arrays;
import java.util.Base64;
import org.bouncycastle.crypto.generators.Argon2BytesGenerator;
import org.bouncycastle.crypto.params.Argon2Parameters;

/**
 * Argon2id (RFC 9106) by a library, with a salt of 16 bytes. The cost is written into each hash, so
 * that it can rise later without locking anyone out.
 */
public final class Passwords {
  /**
   * How much a guess costs.
   *
   * @param memoryKibibytes memory for one hash
   * @param passes over that memory
   */
  public record Cost(int memoryKibibytes, int passes) {
    /**
     * 19 MiB and two passes: the least that the OWASP password storage guidance asks of Argon2id.
     */
    public static final Cost USUAL = new Cost(19 * 1024, 2);
  }

  private static final int SALT_BYTES = 16;
  private static final int HASH_BYTES = 32;
  private static final int LANES = 1;
  private static final Base64.Encoder ENCODER = Base64.getEncoder().withoutPadding();

  private final SecureRandom random;
  private final Cost cost;

  /** Draws salts from {@code random} and makes new hashes at that cost. */
  public Passwords(SecureRandom random, Cost cost) {
    this.random = random;
    this.cost = cost;
  }

  /** A new hash of the password. */
  public PasswordHash hash(char[] password) {
    byte[] salt = new byte[SALT_BYTES];
    random.nextBytes(salt);
    byte[] hash = argon2id(password, salt, cost);
    return new PasswordHash(
        "$argon2id$v=19$m=%d,t=%d,p=%d$%s$%s"
            .formatted(
                cost.memoryKibibytes(),
                cost.passes(),
                LANES,
                ENCODER.encodeToString(salt),
                ENCODER.encodeToString(hash)));
  }

  /** Whether the password is the one that was hashed; takes the same time either way. */
  public boolean matches(char[] password, PasswordHash kept) {
    String[] parts = kept.encoded().split("\\$", -1);
    String[] parameters = parts[3].split("[=,]", -1);
    Cost keptCost = new Cost(Integer.parseInt(parameters[1]), Integer.parseInt(parameters[3]));
    byte[] salt = Base64.getDecoder().decode(parts[4]);
    byte[] expected = Base64.getDecoder().decode(parts[5]);
    return MessageDigest.isEqual(expected, argon2id(password, salt, keptCost));
  }

  private static byte[] argon2id(char[] password, byte[] salt, Cost cost) {
    Argon2BytesGenerator generator = new Argon2BytesGenerator();
    generator.init(
        new Argon2Parameters.Builder(Argon2Parameters.ARGON2_id)
            .withVersion(Argon2Parameters.ARGON2_VERSION_13)
            .withSalt(salt)
            .withMemoryAsKB(cost.memoryKibibytes())
            .withIterations(cost.passes())
            .withParallelism(LANES)
            .build());
    ByteBuffer encoded = StandardCharsets.UTF_8.encode(CharBuffer.wrap(password));
    byte[] bytes = new byte[encoded.remaining()];
    encoded.get(bytes);
    byte[] hash = new byte[HASH_BYTES];
    generator.generateBytes(bytes, hash);
    Arrays.fill(bytes, (byte) 0);
    return hash;
  }
}
