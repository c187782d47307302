package org.evenbeam.store;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;

/** The database of a laboratory's folder by its two users, past the store. */
final class FolderStore {
  private final LogbookFolder folder;

  FolderStore(Path folder) {
    this.folder = LogbookFolder.at(folder);
  }

  Connection owner() throws SQLException {
    return DriverManager.getConnection(url(), OwnersConnection.USER, passwords().owner());
  }

  Connection everyday() throws SQLException {
    return DriverManager.getConnection(url(), Database.EVERYDAY, passwords().everyday());
  }

  int byOwner(String sql) throws SQLException {
    return execute(owner(), sql);
  }

  int byEveryday(String sql) throws SQLException {
    return execute(everyday(), sql);
  }

  private static int execute(Connection connection, String sql) throws SQLException {
    try (connection;
        Statement statement = connection.createStatement()) {
      statement.execute(sql);
      return statement.getUpdateCount();
    }
  }

  private String url() {
    return "jdbc:h2:retry:" + LogbookFolder.withoutEnding(folder.database()) + ";IFEXISTS=TRUE";
  }

  private Passwords passwords() {
    return Passwords.read(folder.passwords());
  }
}
