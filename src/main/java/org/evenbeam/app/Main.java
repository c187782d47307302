package org.evenbeam.app;

/** The launcher. */
public final class Main {
  private Main() {}

  /** Starts the program. */
  public static void main(String[] arguments) {
    System.out.println("Evenbeam");
  }
}
