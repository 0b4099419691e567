package org.notchwork.catalogue;

import java.util.List;
import java.util.Optional;
import org.notchwork.engine.Engine;
import org.notchwork.engine.annihilator.AnnihilatorEngine;
import org.notchwork.engine.fibre.FibreEngine;
import org.notchwork.engine.statevector.StateVectorEngine;

/** The engines there are. */
public final class Engines {

    private static final List<Engine> ALL =
            List.of(new StateVectorEngine(), new FibreEngine(), new AnnihilatorEngine());

    private Engines() {}

    /** Returns all engines, in the order of the documentation. */
    public static List<Engine> all() {
        return ALL;
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
