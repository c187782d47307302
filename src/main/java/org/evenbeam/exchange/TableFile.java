package org.evenbeam.exchange;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import org.evenbeam.logbook.files.BadInput;

/** A table in a CSV file (RFC 4180) in UTF-8, with an expected header. */
final class TableFile {
  private static final char BYTE_ORDER_MARK = '\ufeff';

  private TableFile() {}

  /**
   * Reads a whole table.
   *
   * @param file the file
   * @param header the names that its first line must have, in that order
   * @return the rows under the header, none of them empty
   * @throws BadInput when the file cannot be read, is not CSV, is empty or has another header
   */
  static List<TableRow> read(Path file, List<String> header) {
    List<CsvRecord> records = records(file);
    if (records.isEmpty()) {
      throw BadInput.empty(file);
    }
    requireHeader(file, header, records.get(0));
    if (records.size() == 1) {
      throw BadInput.empty(file);
    }
    List<TableRow> rows = new ArrayList<>(records.size() - 1);
    for (CsvRecord record : records.subList(1, records.size())) {
      rows.add(row(file, header, record));
    }
    return rows;
  }

  private static void requireHeader(Path file, List<String> header, CsvRecord first) {
    List<String> found = new ArrayList<>(first.getFields());
    if (!found.get(0).isEmpty() && found.get(0).charAt(0) == BYTE_ORDER_MARK) {
      found.set(0, found.get(0).substring(1));
    }
    if (!found.equals(header)) {
      throw BadInput.header(file, String.join(",", header), String.join(",", found));
    }
  }

  private static TableRow row(Path file, List<String> header, CsvRecord record) {
    if (record.getFieldCount() != header.size()) {
      throw BadInput.columns(
          file, record.getStartingLineNumber(), header.size(), record.getFieldCount());
    }
    return new TableRow(file, record.getStartingLineNumber(), header, record.getFields());
  }

  private static List<CsvRecord> records(Path file) {
    List<CsvRecord> records = new ArrayList<>();
    try (CsvReader<CsvRecord> reader =
        CsvReader.builder()
            .skipEmptyLines(true)
            .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
            .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
            .ofCsvRecord(text(file))) {
      Iterator<CsvRecord> iterator = reader.iterator();
      while (iterator.hasNext()) {
        records.add(iterator.next());
      }
      return records;
    } catch (CsvParseException malformed) {
      long line =
          records.isEmpty() ? 1 : records.get(records.size() - 1).getStartingLineNumber() + 1;
      throw BadInput.malformed(file, line, String.valueOf(malformed.getMessage()));
    } catch (IOException | UncheckedIOException unreadable) {
      throw BadInput.unreadable(file, String.valueOf(unreadable.getMessage()));
    }
  }

  /** Whole, so that text that is not UTF-8 is refused and not replaced. */
  private static String text(Path file) {
    try {
      return StandardCharsets.UTF_8
          .newDecoder()
          .onMalformedInput(CodingErrorAction.REPORT)
          .onUnmappableCharacter(CodingErrorAction.REPORT)
          .decode(ByteBuffer.wrap(Files.readAllBytes(file)))
          .toString();
    } catch (CharacterCodingException notUtf8) {
      throw BadInput.unreadable(file, "UTF-8");
    } catch (IOException unreadable) {
      throw BadInput.unreadable(file, unreadable.getClass().getSimpleName());
    }
  }
}
