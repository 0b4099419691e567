package org.notchwork.seed;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.regex.Pattern;
import org.apache.commons.rng.core.source64.Philox4x64;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Known answers from the file kat_vectors of Random123 (D. E. Shaw Research): counter, key, output of ten rounds. */
class PhiloxKnownAnswersTest {

    private static final Pattern SPACE = Pattern.compile(" +");

    @ParameterizedTest
    @ValueSource(
            strings = {
                "0000000000000000 0000000000000000 0000000000000000 0000000000000000"
                        + " 0000000000000000 0000000000000000"
                        + " 16554d9eca36314c db20fe9d672d0fdc d7e772cee186176b 7e68b68aec7ba23b",
                "ffffffffffffffff ffffffffffffffff ffffffffffffffff ffffffffffffffff"
                        + " ffffffffffffffff ffffffffffffffff"
                        + " 87b092c3013fe90b 438c3c67be8d0224 9cc7d7c69cd777b6 a09caebf594f0ba0",
                "243f6a8885a308d3 13198a2e03707344 a4093822299f31d0 082efa98ec4e6c89"
                        + " 452821e638d01377 be5466cf34e90c6c"
                        + " a528f45403e61d95 38c72dbd566e9788 a5a1610e72fd18b5 57bd43b5e52b7fe6"
            })
    void theGeneratorGivesTheKnownAnswers(String line) {
        long[] words = SPACE.splitAsStream(line)
                .mapToLong(HexFormat::fromHexDigitsToLong)
                .toArray();
        long[] before = predecessor(new long[] {words[0], words[1], words[2], words[3]});
        Philox4x64 source = new Philox4x64(new long[] {words[4], words[5], before[0], before[1], before[2], before[3]});
        List<String> block = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            block.add(HexFormat.of().toHexDigits(source.next()));
        }
        assertEquals(
                List.of(
                        HexFormat.of().toHexDigits(words[6]),
                        HexFormat.of().toHexDigits(words[7]),
                        HexFormat.of().toHexDigits(words[8]),
                        HexFormat.of().toHexDigits(words[9])),
                block);
    }

    /** The generator adds 1 to the counter before each block, so it has to start one before the wanted one. */
    private static long[] predecessor(long[] counter) {
        for (int i = 0; i < counter.length; i++) {
            counter[i]--;
            if (counter[i] != -1) {
                break;
            }
        }
        return counter;
    }
}
