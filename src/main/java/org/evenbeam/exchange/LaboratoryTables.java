package org.evenbeam.exchange;

import java.nio.file.Path;
import java.time.DateTimeException;
import java.time.ZoneId;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import org.evenbeam.logbook.Role;
import org.evenbeam.logbook.files.BadInput;
import org.evenbeam.logbook.instruments.Instrument;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.logbook.people.NewPerson;
import org.evenbeam.logbook.standards.ReferenceStandard;
import org.evenbeam.metrology.DecimalSign;

/** The tables of a laboratory's own things: itself, its people, instruments and standards. */
final class LaboratoryTables {
  private static final List<String> LABORATORY =
      List.of("name", "address", "zone", "decimal_sign", "language");
  private static final List<String> PEOPLE = List.of("sign_in_name", "name", "role", "password");
  private static final List<String> INSTRUMENTS =
      List.of(
          "tag",
          "kind",
          "maker",
          "model",
          "serial_number",
          "location",
          "measurand",
          "unit",
          "range_low",
          "range_high",
          "resolution",
          "firmware");
  private static final List<String> STANDARDS =
      List.of("tag", "kind", "maker", "serial_number", "unit");

  private final Path folder;

  LaboratoryTables(Path folder) {
    this.folder = folder;
  }

  /**
   * A person and the first password.
   *
   * @param person the person
   * @param password as typed
   */
  record Member(NewPerson person, String password) {}

  Laboratory laboratory() {
    TableRow row = TableFile.read(folder.resolve("laboratory.csv"), LABORATORY).get(0);
    return new Laboratory(
        row.text("name"),
        row.text("address").replace(" / ", "\n"),
        zone(row),
        constant(row, "decimal_sign", DecimalSign.class),
        row.text("language"));
  }

  List<Member> people() {
    return rows("people.csv", PEOPLE, LaboratoryTables::member);
  }

  List<Instrument> instruments() {
    return rows("instruments.csv", INSTRUMENTS, LaboratoryTables::instrument);
  }

  List<ReferenceStandard> standards() {
    return rows(
        "standards.csv",
        STANDARDS,
        row ->
            new ReferenceStandard(
                row.text("tag"),
                row.text("kind"),
                row.text("maker"),
                row.text("serial_number"),
                row.text("unit")));
  }

  /**
   * The constant that a cell names in lower case with hyphens.
   *
   * @throws BadInput when it names none
   */
  static <E extends Enum<E>> E constant(TableRow row, String column, Class<E> type) {
    String name = row.text(column);
    return Arrays.stream(type.getEnumConstants())
        .filter(constant -> lowered(constant).equals(name))
        .findFirst()
        .orElseThrow(
            () ->
                BadInput.range(
                    row.place(column),
                    name,
                    String.join(
                        ", ",
                        Arrays.stream(type.getEnumConstants())
                            .map(LaboratoryTables::lowered)
                            .toList())));
  }

  private static String lowered(Enum<?> constant) {
    return constant.name().toLowerCase(Locale.ROOT).replace('_', '-');
  }

  private <T> List<T> rows(String file, List<String> header, Function<TableRow, T> maker) {
    return TableFile.read(folder.resolve(file), header).stream().map(maker).toList();
  }

  private static Member member(TableRow row) {
    return new Member(
        new NewPerson(
            row.text("sign_in_name"), row.text("name"), constant(row, "role", Role.class)),
        row.text("password"));
  }

  private static Instrument instrument(TableRow row) {
    return new Instrument(
        row.text("tag"),
        row.text("kind"),
        row.text("maker"),
        row.text("model"),
        row.text("serial_number"),
        row.text("location"),
        row.text("measurand"),
        row.text("unit"),
        row.requiredNumber("range_low"),
        row.requiredNumber("range_high"),
        row.positive("resolution").orElseThrow(() -> BadInput.missing(row.place("resolution"))),
        row.optional("firmware").orElse(""));
  }

  private static ZoneId zone(TableRow row) {
    try {
      return ZoneId.of(row.text("zone"));
    } catch (DateTimeException unknown) {
      throw BadInput.range(row.place("zone"), row.text("zone"), "Europe/Lisbon, …");
    }
  }
}
