/**
 * Stabilizer states: circuits of Clifford gates on thousands of qubits, followed exactly and without amplitudes.
 *
 * <p>A state that Clifford gates make from |0…0⟩ is known by n commuting Pauli words that leave it as it is (D.
 * Gottesman, The Heisenberg representation of quantum computers, 1998). {@link
 * org.notchwork.engine.stabilizer.Tableau} carries them through gates and measurements, {@link
 * org.notchwork.engine.stabilizer.OutcomeSpace} says what a measurement of some of the qubits may find. Uses {@code
 * bits} and the streams of {@code seed}, nothing else of the house.
 */
package org.notchwork.engine.stabilizer;
