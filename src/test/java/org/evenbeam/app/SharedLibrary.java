package org.evenbeam.app;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/**
 * A shared library's file, as far as it says which others it is linked with (ELF-64, gABI chapter
 * 5).
 */
final class SharedLibrary {
  private static final int SECTION_TABLE = 0x28;
  private static final int SECTION_SIZE = 0x3a;
  private static final int DYNAMIC = 6;
  private static final long NEEDED = 1;

  private final ByteBuffer file;

  SharedLibrary(byte[] bytes) {
    this.file = ByteBuffer.wrap(bytes).order(ByteOrder.LITTLE_ENDIAN);
  }

  /** The libraries that the loader must find before this one can be used. */
  List<String> needed() {
    int sections = (int) file.getLong(SECTION_TABLE);
    int size = file.getShort(SECTION_SIZE);
    int count = file.getShort(SECTION_SIZE + 2);
    List<String> needed = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      int section = sections + i * size;
      if (file.getInt(section + 4) == DYNAMIC) {
        int strings = sections + file.getInt(section + 0x28) * size;
        collect(section, (int) file.getLong(strings + 0x18), needed);
      }
    }
    return needed;
  }

  private void collect(int section, int strings, List<String> needed) {
    int start = (int) file.getLong(section + 0x18);
    int end = start + (int) file.getLong(section + 0x20);
    for (int entry = start; entry < end; entry += 16) {
      if (file.getLong(entry) == NEEDED) {
        needed.add(text(strings + (int) file.getLong(entry + 8)));
      }
    }
  }

  private String text(int from) {
    int to = from;
    while (file.get(to) != 0) {
      to++;
    }
    return new String(file.array(), from, to - from, StandardCharsets.US_ASCII);
  }
}
