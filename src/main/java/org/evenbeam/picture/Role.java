package org.evenbeam.picture;

/** What a shape is for; screen and paper each give it a colour. */
public enum Role {
  /** What must be read first: readings, fulcrum, values. */
  INK,
  /** What only explains. */
  QUIET,
  /** Axes and rules. */
  LINE,
  /** The interval, its ends and its estimate. */
  BEAM,
  /** A limit. */
  POST,
  /** CONFORMS. */
  LEVEL,
  /** DOES NOT CONFORM. */
  TILT,
  /** UNDECIDED. */
  SWAY,
  /** The ground the picture lies on. */
  SHEET
}
