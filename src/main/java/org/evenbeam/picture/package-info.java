/**
 * Pictures described once, as shapes with roles, and painted by screen and paper alike: the beam
 * plot, the spread bar and the marks of the verdicts. What the figures mean is {@code
 * verification}; how they are written is asked of {@link org.evenbeam.picture.Labels}, how wide of
 * {@link org.evenbeam.picture.TextMeasure}. No colour and no sentence is made here.
 */
package org.evenbeam.picture;
