package org.notchwork.problem;

/**
 * A circuit of CNOT and X gates that maps |x⟩|z⟩ to |x⟩|z ⊕ f(x)⟩. Immutable.
 *
 * <p>Qubits 0 … inputs − 1 are the input register, bit i of x on qubit i; the value register follows, bit i of the value
 * on qubit inputs + i.
 */
public final class Network {

    /** Stands in the place of a control for an X gate. */
    public static final int NO_CONTROL = -1;

    private final int inputs;
    private final int values;
    private final int[] controls;
    private final int[] targets;

    /**
     * Creates a circuit.
     *
     * @param inputs how many qubits the input register has
     * @param values how many qubits the value register has
     * @param controls the control of each gate, {@link #NO_CONTROL} for an X gate
     * @param targets the target of each gate
     */
    public Network(int inputs, int values, int[] controls, int[] targets) {
        if (controls.length != targets.length) {
            throw new IllegalArgumentException(controls.length + " controls of " + targets.length + " gates");
        }
        this.inputs = inputs;
        this.values = values;
        this.controls = controls.clone();
        this.targets = targets.clone();
        for (int gate = 0; gate < targets.length; gate++) {
            requireGate(controls[gate], targets[gate]);
        }
    }

    private void requireGate(int control, int target) {
        int qubits = inputs + values;
        boolean known = target >= 0 && target < qubits && control >= NO_CONTROL && control < qubits;
        if (!known || control == target) {
            throw new IllegalArgumentException("no gate from " + control + " to " + target);
        }
    }

    /** Returns how many qubits the input register has. */
    public int inputs() {
        return inputs;
    }

    /** Returns how many qubits the value register has. */
    public int values() {
        return values;
    }

    /** Returns how many gates there are. */
    public int size() {
        return targets.length;
    }

    /** Returns the control of a gate, {@link #NO_CONTROL} for an X gate. */
    public int control(int gate) {
        return controls[gate];
    }

    /** Returns the target of a gate. */
    public int target(int gate) {
        return targets[gate];
    }
}
