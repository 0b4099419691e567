package org.notchwork.figure;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;
import org.notchwork.trial.ControlRecord;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;

/** Gathers trials as they pass and makes the figures of a study. */
public final class SummaryBuilder {

    private record Place(String experiment, int width) {}

    private final Map<Place, List<CellTally>> cells = new LinkedHashMap<>();
    private final Map<Place, List<PairTally>> pairs = new LinkedHashMap<>();

    /** Starts with no trials. */
    public SummaryBuilder(Study study) {
        for (Experiment experiment : study.experiments()) {
            for (int width : experiment.widths()) {
                Place place = new Place(experiment.id(), width);
                cells.put(place, tallies(experiment, width));
                pairs.put(place, pairs(experiment, width));
            }
        }
    }

    /**
     * Adds one instance faced by every strategy of its experiment.
     *
     * @throws IllegalArgumentException if the records are not one a strategy, in the order of the study
     */
    public void add(TrialGroup group) {
        Place place = new Place(group.experiment(), group.width());
        List<TrialRecord> records = group.records();
        List<CellTally> tallies = cells.getOrDefault(place, List.of());
        requireFit(group, tallies);
        for (int i = 0; i < records.size(); i++) {
            tallies.get(i).add(records.get(i));
        }
        int next = 0;
        List<PairTally> pairTallies = pairs.get(place);
        for (int i = 0; i < records.size(); i++) {
            for (int j = i + 1; j < records.size(); j++) {
                pairTallies.get(next++).add(records.get(i), records.get(j));
            }
        }
    }

    /** Adds one control. */
    public void addControl(ControlRecord record) {
        Place place = new Place(record.cell().experiment(), record.cell().width());
        cells.getOrDefault(place, List.of()).stream()
                .filter(tally -> tally.cell().equals(record.cell()))
                .forEach(tally -> tally.add(record));
    }

    /** Returns how often each number of queries occurred in a cell. */
    public SortedMap<Long, Long> distribution(Cell cell) {
        return cells.getOrDefault(new Place(cell.experiment(), cell.width()), List.of()).stream()
                .filter(tally -> tally.cell().equals(cell))
                .findFirst()
                .map(CellTally::distribution)
                .orElseThrow(() -> new IllegalArgumentException("no cell " + cell.id()));
    }

    /** Returns the figures of all trials added; every cell must have had one. */
    public Summary summary() {
        return new Summary(
                cells.values().stream()
                        .flatMap(List::stream)
                        .map(CellTally::figures)
                        .toList(),
                pairs.values().stream()
                        .flatMap(List::stream)
                        .map(PairTally::figures)
                        .toList());
    }

    private static void requireFit(TrialGroup group, List<CellTally> tallies) {
        List<Cell> given = group.records().stream().map(TrialRecord::cell).toList();
        List<Cell> wanted = tallies.stream().map(CellTally::cell).toList();
        if (wanted.isEmpty() || !given.equals(wanted)) {
            throw new IllegalArgumentException("trial " + group.trial() + " of " + group.experiment() + "/"
                    + group.width() + " has the cells " + given + ", not " + wanted);
        }
    }

    private static List<CellTally> tallies(Experiment experiment, int width) {
        List<CellTally> tallies = new ArrayList<>();
        for (StrategyChoice choice : experiment.strategies()) {
            tallies.add(new CellTally(experiment.problem(), new Cell(experiment.id(), width, choice.label()), choice));
        }
        return tallies;
    }

    private static List<PairTally> pairs(Experiment experiment, int width) {
        List<Cell> line = experiment.strategies().stream()
                .map(s -> new Cell(experiment.id(), width, s.label()))
                .toList();
        List<PairTally> tallies = new ArrayList<>();
        for (int i = 0; i < line.size(); i++) {
            for (int j = i + 1; j < line.size(); j++) {
                tallies.add(new PairTally(line.get(i), line.get(j)));
            }
        }
        return tallies;
    }
}
