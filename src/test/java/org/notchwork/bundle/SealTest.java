package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;

class SealTest {

    private static final List<String> NAMES = List.of("claims.json", "study.json");
    private static final Seal SEAL =
            new Seal(Map.of("study.json", "b".repeat(64), "claims.json", "a".repeat(64)), 12, "c".repeat(64));

    /** The digest is that of the text without the member seal, which is typed in here. */
    @Test
    void theSealIsTheDigestOfTheFileWithoutIt() {
        String body = "{\"files\":{\"claims.json\":\"" + "a".repeat(64) + "\",\"study.json\":\"" + "b".repeat(64)
                + "\"},\"format\":\"notchwork-seal/1\",\"trials\":{\"count\":12,\"root\":\"" + "c".repeat(64) + "\"}}";
        assertEquals(TestBag.sha256(body.getBytes(StandardCharsets.UTF_8)), SEAL.digest());
        assertEquals(
                body.replace(",\"trials\"", ",\"seal\":\"" + SEAL.digest() + "\",\"trials\""),
                CanonicalJson.text(SEAL.write()));
    }

    @Test
    void everyPartMovesTheSeal() {
        Map<String, String> files = new TreeMap<>(SEAL.files());
        files.put("study.json", "d".repeat(64));
        assertNotEquals(SEAL.digest(), new Seal(files, 12, SEAL.root()).digest());
        assertNotEquals(SEAL.digest(), new Seal(SEAL.files(), 13, SEAL.root()).digest());
        assertNotEquals(SEAL.digest(), new Seal(SEAL.files(), 12, "d".repeat(64)).digest());
    }

    @Test
    void aWrittenSealReadsBack() {
        List<Fault> faults = new ArrayList<>();
        assertEquals(SEAL, Seal.read(SEAL.write(), NAMES, faults));
        assertEquals(List.of(), faults);
    }

    @ParameterizedTest
    @CsvSource({
        "'\"count\":12', '\"count\":0'",
        "notchwork-seal/1, notchwork-seal/2",
        "study.json, studio.json",
        "aaaa, AAAA",
        "aaaa, aaa",
        "'\"root\"', '\"roof\"'"
    })
    void aSealOfAnotherFormIsNoted(String from, String to) throws JsonFault {
        String text = CanonicalJson.text(SEAL.write());
        String changed = text.replaceFirst(from, to);
        assertNotEquals(text, changed);
        List<Fault> faults = new ArrayList<>();
        Seal.read(new JsonReader(JsonLimits.FILE).read(changed.getBytes(StandardCharsets.UTF_8)), NAMES, faults);
        assertFalse(faults.isEmpty());
    }

    @Test
    void groupsOfEightCanBeReadAloud() {
        assertEquals(
                "01234567 89abcdef 01234567 89abcdef 01234567 89abcdef 01234567 89abcdef",
                Seal.groups("0123456789abcdef".repeat(4)));
    }

    /** NIST FIPS 180-4 example: SHA-256 of "abc". */
    @Test
    void digestsAreThoseOfTheStandard() {
        assertEquals("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad", Digests.hex("abc"));
    }
}
