package org.evenbeam.logbook;

import com.fasterxml.jackson.annotation.JsonAutoDetect.Visibility;
import com.fasterxml.jackson.annotation.PropertyAccessor;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.SerializationFeature;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.module.SimpleModule;
import com.fasterxml.jackson.databind.ser.std.ToStringSerializer;
import com.fasterxml.jackson.datatype.jdk8.Jdk8Module;
import com.fasterxml.jackson.datatype.jsr310.JavaTimeModule;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import org.evenbeam.trail.CanonicalForm;

/**
 * Records as JSON that is kept for years: decimals as texts with their trailing zeros, times and
 * dates by ISO 8601, members in canonical order (RFC 8785). Only a record's own components are
 * written, so a method added to a record changes nothing; a test holds the form against files
 * written by earlier releases.
 */
public final class LastingJson {
  private static final ObjectMapper MAPPER =
      JsonMapper.builder()
          .addModule(new Jdk8Module())
          .addModule(new JavaTimeModule())
          .addModule(
              new SimpleModule().addSerializer(BigDecimal.class, ToStringSerializer.instance))
          .visibility(PropertyAccessor.ALL, Visibility.NONE)
          .visibility(PropertyAccessor.FIELD, Visibility.ANY)
          .visibility(PropertyAccessor.CREATOR, Visibility.ANY)
          .disable(SerializationFeature.WRITE_DATES_AS_TIMESTAMPS)
          .enable(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES)
          .build();

  private LastingJson() {}

  /** The record in canonical JSON. */
  public static String write(Object record) {
    try {
      return CanonicalForm.canonical(MAPPER.writeValueAsString(record));
    } catch (JsonProcessingException unwritable) {
      throw new UncheckedIOException(unwritable);
    }
  }

  /**
   * The record that was written.
   *
   * @throws UncheckedIOException when the text is not such a record
   */
  public static <T> T read(String json, Class<T> type) {
    try {
      return MAPPER.readValue(json, type);
    } catch (JsonProcessingException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }
}
