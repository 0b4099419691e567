package org.notchwork.catalogue;

import java.util.List;
import java.util.Optional;
import org.notchwork.engine.Engine;
import org.notchwork.engine.annihilator.AnnihilatorEngine;
import org.notchwork.engine.fibre.FibreEngine;
import org.notchwork.engine.stabilizer.StabilizerEngine;
import org.notchwork.engine.statevector.StateVectorEngine;
import org.notchwork.engine.weights.WeightsEngine;

/** The engines there are. */
public final class Engines {

    private static final List<Engine> REFERENCE =
            List.of(new StateVectorEngine(), new FibreEngine(), new AnnihilatorEngine());

    private static final List<Engine> ALL = List.of(
            new StateVectorEngine(),
            new FibreEngine(),
            new WeightsEngine(),
            new StabilizerEngine(),
            new AnnihilatorEngine());

    private static final List<Engine> BY_STRENGTH = List.of(
            new StateVectorEngine(),
            new StabilizerEngine(),
            new WeightsEngine(),
            new FibreEngine(),
            new AnnihilatorEngine());

    private Engines() {}

    /** Returns all engines, in the order of the documentation. */
    public static List<Engine> all() {
        return ALL;
    }

    /**
     * Returns the engines that every comparison of outcome distributions includes, whatever a study names. The list is
     * a rule of the format: what is compared is written under the seal, so an engine added later is not added here.
     */
    public static List<Engine> reference() {
        return REFERENCE;
    }

    /**
     * Returns all engines, the strongest evidence first: gate by gate on both registers, on the circuit of an affine
     * function, from evaluations, told the secret.
     */
    public static List<Engine> byStrength() {
        return BY_STRENGTH;
    }

    /** Returns the names, in the order of the documentation. */
    public static List<String> names() {
        return ALL.stream().map(Engine::name).toList();
    }

    /** Returns the engine of a name. */
    public static Optional<Engine> engine(String name) {
        return ALL.stream().filter(e -> e.name().equals(name)).findFirst();
    }
}
