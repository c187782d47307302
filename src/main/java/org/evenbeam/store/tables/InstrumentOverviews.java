package org.evenbeam.store.tables;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.instruments.Instrument;
import org.evenbeam.logbook.instruments.InstrumentOverview;
import org.evenbeam.logbook.instruments.InstrumentStatus;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.store.rows.OpenTransaction;
import org.jdbi.v3.core.mapper.RowMapper;
import org.jdbi.v3.core.mapper.reflect.ConstructorMapper;
import org.jdbi.v3.core.statement.StatementContext;

/** Instruments with their present status and their last approved run that conforms. */
final class InstrumentOverviews {
  /**
   * An instrument without an event that sets a status is not in service: nobody has released it.
   */
  private static final InstrumentStatus BEFORE_ANY_EVENT = InstrumentStatus.OUT_OF_SERVICE;

  private static final String ALL =
      """
      with latest_status as (
        select instrument_id, max(id) as event_id
        from instrument_event where status is not null group by instrument_id),
      conforming as (
        select r.instrument_id, r.started_at, v.interval_days,
          row_number() over (
            partition by r.instrument_id order by r.started_at desc, r.number desc) as recency
        from run_event approval
        join submission s on s.event_id = approval.answers_event_id
        join run r on r.number = approval.run
        join plan_revision v on v.id = r.plan_revision_id
        where approval.step = 'APPROVED' and s.verdict = 'CONFORMS')
      select %s, e.status, e.text, c.started_at, c.interval_days
      from instrument i
      left join latest_status l on l.instrument_id = i.id
      left join instrument_event e on e.id = l.event_id
      left join conforming c on c.instrument_id = i.id and c.recency = 1
      order by i.tag
      """
          .formatted(InstrumentTable.COLUMNS);

  private InstrumentOverviews() {}

  static List<InstrumentOverview> all(Transaction transaction) {
    ZoneId zone = zone(transaction);
    RowMapper<Instrument> instrument = ConstructorMapper.of(Instrument.class);
    return OpenTransaction.reading(transaction)
        .createQuery(ALL)
        .map((row, context) -> overview(row, context, instrument, zone))
        .list();
  }

  /** The zone by which the laboratory counts its days. */
  static ZoneId zone(Transaction transaction) {
    return new LaboratoryTable()
        .find(transaction)
        .map(Laboratory::zone)
        .orElseThrow(() -> new NotFound(NotFound.Thing.LABORATORY, ""));
  }

  private static InstrumentOverview overview(
      ResultSet row, StatementContext context, RowMapper<Instrument> instrument, ZoneId zone)
      throws SQLException {
    Optional<Instant> started = Optional.ofNullable(ColumnTypes.instant(row, "started_at"));
    Optional<LocalDate> day = started.map(at -> LocalDate.ofInstant(at, zone));
    int interval = row.getInt("interval_days");
    String status = row.getString("status");
    return new InstrumentOverview(
        instrument.map(row, context),
        status == null ? BEFORE_ANY_EVENT : InstrumentStatus.valueOf(status),
        Optional.ofNullable(row.getString("text")).orElse(""),
        day,
        day.map(performed -> performed.plusDays(interval)));
  }
}
