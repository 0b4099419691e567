package org.notchwork.study;

import java.util.Optional;

/**
 * What came of reading one experiment.
 *
 * @param id the id; empty if it could not be read
 * @param experiment the experiment; present exactly if it is without fault
 */
record ExperimentReading(String id, Optional<Experiment> experiment) {}
