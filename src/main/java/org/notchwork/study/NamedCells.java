package org.notchwork.study;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.notchwork.json.Fields;
import org.notchwork.json.Spelling;

/**
 * The cells that claims may name.
 *
 * <p>A name is faulty only if that is certain: one that may belong to an experiment with faults of its own is let pass,
 * so that one slip of the author is reported once.
 */
final class NamedCells {

    private static final int LONGEST_ID = 160;
    private static final String UNREADABLE = "";

    private final Map<String, Cell> cells = new TreeMap<>();
    private final List<String> inOrder = new ArrayList<>();
    private final Set<String> faulty = new TreeSet<>();

    /** Collects the cells of the experiments that are without fault. */
    NamedCells(List<ExperimentReading> experiments) {
        Set<String> ids = new TreeSet<>();
        for (ExperimentReading reading : experiments) {
            if (reading.experiment().isEmpty()) {
                faulty.add(reading.id());
            }
            if (!ids.add(reading.id())) {
                faulty.add(UNREADABLE);
            }
            for (Cell cell : reading.experiment().map(Experiment::cells).orElse(List.of())) {
                cells.put(cell.id(), cell);
                inOrder.add(cell.id());
            }
        }
    }

    /** Returns the cell that a member names; empty if a fault was noted, or the cell cannot be known. */
    Optional<Cell> read(Fields fields, String name) {
        String id = fields.text(name, 1, LONGEST_ID);
        Optional<Cell> cell = Optional.ofNullable(cells.get(id));
        if (cell.isEmpty() && !id.isEmpty() && isCertainlyUnknown(id)) {
            fields.fault(name, "no cell " + Fields.quoted(id), mend(id));
        }
        return cell;
    }

    /** An experiment whose id could not be read, or was taken already, may have been meant by any name. */
    private boolean isCertainlyUnknown(String id) {
        int slash = id.indexOf('/');
        String experiment = slash < 0 ? id : id.substring(0, slash);
        return !faulty.contains(experiment) && !faulty.contains(UNREADABLE);
    }

    private String mend(String id) {
        return Spelling.nearest(id, inOrder)
                .map(near -> "did you mean \"" + near + "\"?")
                .orElseGet(() -> "EXPERIMENT/WIDTH/LABEL is wanted"
                        + inOrder.stream()
                                .max(Comparator.comparingInt(c -> shared(c, id)))
                                .map(c -> ", for example \"" + c + "\"")
                                .orElse(""));
    }

    private static int shared(String a, String b) {
        int i = 0;
        while (i < a.length() && i < b.length() && a.charAt(i) == b.charAt(i)) {
            i++;
        }
        return i;
    }
}
