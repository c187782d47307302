package org.evenbeam.store;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Role;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.people.NewPerson;
import org.evenbeam.logbook.people.PasswordHash;

/** Another program with a laboratory's folder open, in a process of its own. */
final class ChildStore implements AutoCloseable {
  static final String READY = "ready";

  private final Process process;
  private final BufferedReader says;

  /** Starts it: {@code hold} opens and waits, {@code write} makes changes without end. */
  ChildStore(Path folder, String task) throws IOException {
    String path =
        System.getProperty("surefire.test.class.path", System.getProperty("java.class.path"));
    String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
    process =
        new ProcessBuilder(java, "-cp", path, ChildStore.class.getName(), folder.toString(), task)
            .redirectError(ProcessBuilder.Redirect.DISCARD)
            .start();
    says = process.inputReader(StandardCharsets.UTF_8);
  }

  /** The next line that it says, null at its end. */
  String line() throws IOException {
    return says.readLine();
  }

  long pid() {
    return process.pid();
  }

  /**
   * Kills it at once, as by {@code kill -9}, and returns what it had said by then; by its handle,
   * since the process itself would close its output unread.
   */
  List<String> kill() throws InterruptedException {
    process.toHandle().destroyForcibly();
    process.waitFor();
    return says.lines().toList();
  }

  @Override
  public void close() throws IOException {
    process.destroyForcibly();
    says.close();
  }

  /** The other program. */
  public static void main(String[] arguments) throws IOException {
    try (LogbookStore store = LogbookStore.open(Path.of(arguments[0]), () -> false)) {
      say(READY);
      if ("write".equals(arguments[1])) {
        write(new Story(store));
      }
      new InputStreamReader(System.in, StandardCharsets.UTF_8).read();
    } catch (StoreFailed failed) {
      say(failed.reason() + " " + failed.arguments().get(1));
    }
  }

  private static void write(Story story) {
    List<Person> before = story.read(story.store.people()::all);
    for (int number = before.size() + 1; ; number++) {
      String name = "person" + number;
      story.does(
          UseCase.ADD_PERSON,
          t -> {
            long key = story.store.people().add(t, new NewPerson(name, name, Role.AUDITOR));
            story.store.people().setPassword(t, key, new PasswordHash("of " + name), Story.NOON);
          });
      say(name);
    }
  }

  private static void say(String line) {
    System.out.println(line);
    System.out.flush();
  }
}
