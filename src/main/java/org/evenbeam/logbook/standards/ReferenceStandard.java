package org.evenbeam.logbook.standards;

/**
 * A reference standard (VIM 5.6) or reference material (VIM 5.13).
 *
 * @param tag the laboratory's own mark on it; unique
 * @param kind what it is, such as weight of class E2
 * @param maker who made it
 * @param serialNumber serial number, or the lot of a material
 * @param unit the UCUM code of its values' unit
 */
public record ReferenceStandard(
    String tag, String kind, String maker, String serialNumber, String unit) {}
