package treadwork.solver.marker;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import treadwork.fixtures.sample.SmallCapture;
import treadwork.model.capture.Capture;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.Exchange;

class ExchangesTest {

    private static final Capture CAPTURE = SmallCapture.withoutPlates();
    private static final String ONE = CAPTURE.points().get(0).label();
    private static final String OTHER = CAPTURE.points().get(1).label();
    private static final int FIRST = CAPTURE.firstFrame();

    @Test
    void twoPointsChangePlacesInTheirFramesAlone() {
        Exchange exchange = new Exchange(ONE, OTHER, new FrameRange(FIRST + 2, FIRST + 4));

        Capture right = Exchanges.applied(CAPTURE, List.of(exchange));

        for (int i = 0; i < CAPTURE.frames(); i++) {
            boolean exchanged = i >= 2 && i <= 4;
            PointSeries from = CAPTURE.points().get(exchanged ? 1 : 0);
            assertEquals(
                    from.positions().at(i), right.points().get(0).positions().at(i), "frame " + i);
        }
        assertEquals(ONE, right.points().get(0).label());
    }

    @Test
    void exchangedTwiceIsAsItWas() {
        Exchange exchange = new Exchange(ONE, OTHER, CAPTURE.range());

        Capture same = Exchanges.applied(CAPTURE, List.of(exchange, exchange));

        for (int i = 0; i < CAPTURE.frames(); i++) {
            assertEquals(
                    CAPTURE.points().get(1).positions().at(i),
                    same.points().get(1).positions().at(i));
        }
    }

    @Test
    void aLabelThatNoPointHasIsRefusedWithTheNearest() {
        Exchange exchange = new Exchange(ONE + "x", OTHER, CAPTURE.range());

        Finding refusal = refusal(exchange);

        assertEquals("label-missing", refusal.code());
        assertTrue(refusal.figure().contains("\"" + ONE + "\""), refusal.figure());
    }

    @Test
    void framesThatTheCaptureHasNotAreRefused() {
        Exchange exchange =
                new Exchange(ONE, OTHER, new FrameRange(FIRST, CAPTURE.range().last() + 1));

        assertEquals("frames-outside", refusal(exchange).code());
    }

    private static Finding refusal(Exchange exchange) {
        return assertThrows(UnusableInputException.class, () -> Exchanges.applied(CAPTURE, List.of(exchange)))
                .finding();
    }
}
