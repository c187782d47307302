package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.LABORATORY;

import java.util.Optional;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.logbook.laboratory.LaboratoryRecords;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.jdbi.v3.core.mapper.reflect.ConstructorMapper;

/** The laboratory's single row. */
public final class LaboratoryTable implements LaboratoryRecords {
  private static final int THE_ONLY_ONE = 1;

  /** A table of any open store. */
  public LaboratoryTable() {}

  @Override
  public Optional<Laboratory> find(Transaction transaction) {
    return OpenTransaction.reading(transaction)
        .createQuery("select name, address, zone, decimal_sign, language from laboratory")
        .map(ConstructorMapper.of(Laboratory.class))
        .findOne();
  }

  @Override
  public void add(Transaction transaction, Laboratory laboratory) {
    OpenTransaction.rows(transaction)
        .add(
            Row.of(LABORATORY)
                .with("id", THE_ONLY_ONE)
                .with("version", 1L)
                .with("name", laboratory.name())
                .with("address", laboratory.address())
                .with("zone", laboratory.zone().getId())
                .with("decimal_sign", laboratory.decimalSign())
                .with("language", laboratory.language()));
  }
}
