package org.notchwork.seed;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.HashSet;
import java.util.HexFormat;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class SeedTreeTest {

    /** Rows of seed-vectors.tsv, computed apart from this code with Python's hashlib and a Philox of its own. */
    static List<List<String>> vectors() throws IOException {
        try (InputStream in = Objects.requireNonNull(SeedTreeTest.class.getResourceAsStream("/seed-vectors.tsv"))) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .map(line -> Arrays.asList(line.split("\t", -1)))
                    .toList();
        }
    }

    @ParameterizedTest
    @MethodSource("vectors")
    void keysAndFirstWordsAreTheWrittenOnes(List<String> row) {
        SeedTree tree = new SeedTree(new Seed(row.get(0)));
        Address address = new Address(row.get(1), Integer.parseInt(row.get(2)), Long.parseLong(row.get(3)), row.get(4));
        assertEquals(row.get(5), HexFormat.of().formatHex(tree.key(address)));
        RandomStream stream = tree.stream(address);
        for (String word : row.subList(6, 10)) {
            assertEquals(word, HexFormat.of().toHexDigits(stream.nextLong()));
        }
    }

    @Test
    void aStrategysAddressIsApartFromTheInstances() {
        assertEquals(new Address("e", 4, 2, "instance"), Address.instance("e", 4, 2));
        assertEquals(new Address("e", 4, 2, "strategy:instance"), Address.strategy("e", 4, 2, "instance"));
    }

    @Test
    void everyPartOfTheAddressAndTheSeedChangesTheKey() {
        SeedTree tree = new SeedTree(new Seed("0123456789abcdef"));
        SeedTree other = new SeedTree(new Seed("0123456789abcdeg"));
        Set<String> keys = new HashSet<>();
        for (String experiment : List.of("a", "b")) {
            for (int width : List.of(4, 5)) {
                for (long trial : List.of(0L, 1L)) {
                    for (String role : List.of("instance", "strategy:x")) {
                        Address address = new Address(experiment, width, trial, role);
                        keys.add(HexFormat.of().formatHex(tree.key(address)));
                        keys.add(HexFormat.of().formatHex(other.key(address)));
                    }
                }
            }
        }
        assertEquals(32, keys.size());
    }

    @Test
    void aStreamAlwaysStartsAtItsBeginning() {
        SeedTree tree = new SeedTree(new Seed("0123456789abcdef"));
        Address address = Address.instance("e", 4, 2);
        RandomStream first = tree.stream(address);
        long word = first.nextLong();
        assertNotEquals(word, first.nextLong());
        assertEquals(word, tree.stream(address).nextLong());
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "fifteen letters", "sixteen letters\n", "sixteen lètters!", "tab\tis no letter"})
    void otherSeedsAreRefused(String text) {
        assertThrows(IllegalArgumentException.class, () -> new Seed(text));
    }

    @Test
    void seedsHave16To200Characters() {
        assertEquals(16, new Seed("sixteen letters!").text().length());
        assertTrue(Seed.FORM.matcher("~".repeat(200)).matches());
        assertThrows(IllegalArgumentException.class, () -> new Seed("~".repeat(201)));
    }
}
