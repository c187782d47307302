package org.evenbeam.stats.risk;

/**
 * One check point of a run under an assumption about the instrument.
 *
 * @param characteristic the check point's chances at the assumed standard deviation
 * @param bias the assumed bias
 */
public record AssumedPoint(BiasCharacteristic characteristic, double bias) {}
