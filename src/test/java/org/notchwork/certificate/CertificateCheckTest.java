package org.notchwork.certificate;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Pair;
import org.notchwork.support.Given;

class CertificateCheckTest {

    /** Period 5: the pairs 0 and 5, 1 and 4, 2 and 7, 3 and 6. */
    private final BitFunction function = Given.of(3, 3, 6, 1, 0, 3, 1, 6, 3, 0);

    private static Word word(long value) {
        return Word.of(3, value);
    }

    private static Pair pair(long x, long y, long fx, long fy) {
        return new Pair(word(x), word(y), word(fx), word(fy));
    }

    private static Certificate equations(Pair confirmation, long... words) {
        return new Certificate.Equations(
                LongStream.of(words).mapToObj(CertificateCheckTest::word).toList(), confirmation);
    }

    private Optional<String> wrongMember(long answer, Certificate certificate) {
        return CertificateCheck.check(function, new Answer.Period(word(answer)), certificate)
                .map(CertificateCheck.Wrong::member);
    }

    @ParameterizedTest
    @CsvSource({"0, 5, 6, 6", "5, 0, 6, 6", "1, 4, 1, 1", "2, 7, 0, 0"})
    void aCollisionProvesItsSum(long x, long y, long fx, long fy) {
        assertEquals(Optional.empty(), wrongMember(5, new Certificate.Collision(pair(x, y, fx, fy))));
    }

    @ParameterizedTest
    @CsvSource({
        "5, 0, 5, 1, 6, /collision/fx",
        "5, 0, 5, 6, 1, /collision/fy",
        "5, 0, 4, 6, 1, /collision/y",
        "4, 0, 5, 6, 6, /collision/y",
        "4, 0, 4, 6, 1, /collision/fy",
        "5, 1, 5, 1, 6, /collision/y"
    })
    void theFirstWrongMemberOfACollisionIsNamed(long answer, long x, long y, long fx, long fy, String member) {
        assertEquals(Optional.of(member), wrongMember(answer, new Certificate.Collision(pair(x, y, fx, fy))));
    }

    @Test
    void independentOrthogonalWordsAndAConfirmationProveThePeriod() {
        assertEquals(Optional.empty(), wrongMember(5, equations(pair(0, 5, 6, 6), 2, 5)));
        assertEquals(Optional.empty(), wrongMember(5, equations(pair(0, 5, 6, 6), 7, 5)));
    }

    @Test
    void theFirstWrongMemberOfEquationsIsNamed() {
        Pair confirmed = pair(0, 5, 6, 6);
        assertEquals(Optional.of("/equations/words/1"), wrongMember(5, equations(confirmed, 2, 4)));
        assertEquals(Optional.of("/equations/words"), wrongMember(5, equations(confirmed, 2, 2)));
        assertEquals(Optional.of("/equations/words"), wrongMember(5, equations(confirmed, 2)));
        assertEquals(Optional.of("/equations/words"), wrongMember(5, equations(confirmed, 2, 5, 7)));
        assertEquals(Optional.of("/equations/words"), wrongMember(5, equations(confirmed, 0, 2)));
        assertEquals(Optional.of("/equations/confirmation/x"), wrongMember(5, equations(pair(1, 4, 1, 1), 2, 5)));
        assertEquals(Optional.of("/equations/confirmation/fy"), wrongMember(5, equations(pair(0, 5, 6, 1), 2, 5)));
        assertEquals(Optional.of("/equations/confirmation/fy"), wrongMember(4, equations(pair(0, 4, 6, 1), 1, 2)));
    }

    @Test
    void theFaultTellsWhatIsWrittenAndWhatIsRight() {
        assertEquals(
                Optional.of(new CertificateCheck.Wrong("/collision/fx", "1", "6")),
                CertificateCheck.check(
                        function, new Answer.Period(word(5)), new Certificate.Collision(pair(0, 5, 1, 6))));
        assertEquals(
                Optional.of(new CertificateCheck.Wrong("/equations/words", "1 words of rank 1", "2 independent words")),
                CertificateCheck.check(
                        function,
                        new Answer.Period(word(5)),
                        new Certificate.Equations(List.of(word(2)), pair(0, 5, 6, 6))));
    }
}
