package org.evenbeam.app;

/** The program's version. */
final class ProgramVersion {
  private ProgramVersion() {}

  /** From the jar, or that it was built from source. */
  static String text() {
    String version = ProgramVersion.class.getPackage().getImplementationVersion();
    return version == null ? "from source" : version;
  }
}
