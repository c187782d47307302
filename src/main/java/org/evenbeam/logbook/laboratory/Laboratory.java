package org.evenbeam.logbook.laboratory;

import java.time.ZoneId;
import org.evenbeam.metrology.DecimalSign;

/**
 * The laboratory that keeps this logbook.
 *
 * @param name as on certificates
 * @param address as on certificates, one line or more
 * @param zone its time zone
 * @param decimalSign how its people write numbers
 * @param language the language of its certificates, an IETF tag such as en or de
 */
public record Laboratory(
    String name, String address, ZoneId zone, DecimalSign decimalSign, String language) {}
