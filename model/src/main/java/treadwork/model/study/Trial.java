package treadwork.model.study;

import java.util.List;
import java.util.Optional;
import treadwork.model.capture.FrameRange;

/**
 * One movement capture and everything that holds for it.
 *
 * @param file      path relative to the study file
 * @param condition for example "brace on"; empty where none is stated
 * @param markerSet labels of this capture; its clusters list the markers in the same order as the subject's
 * @param contacts  empty: found from the data; else they alone hold
 * @param frames    empty: all
 * @param orthoses  those of this trial's condition
 * @param exchanged labels that the capture has the wrong way round, put right before anything else
 * @param plateFile path of the plates' own file, relative to the study file, of text captures alone
 */
public record Trial(
        String file,
        String condition,
        MarkerSet markerSet,
        LabSettings lab,
        BodySettings body,
        Processing processing,
        ResultSettings results,
        Optional<List<ContactRule>> contacts,
        Optional<FrameRange> frames,
        List<Orthosis> orthoses,
        List<Exchange> exchanged,
        Optional<String> plateFile) {

    public Trial {
        contacts = contacts.map(List::copyOf);
        orthoses = List.copyOf(orthoses);
        exchanged = List.copyOf(exchanged);
    }

    /** With the plates in the capture's file. */
    public Trial(
            String file,
            String condition,
            MarkerSet markerSet,
            LabSettings lab,
            BodySettings body,
            Processing processing,
            ResultSettings results,
            Optional<List<ContactRule>> contacts,
            Optional<FrameRange> frames,
            List<Orthosis> orthoses,
            List<Exchange> exchanged) {
        this(
                file,
                condition,
                markerSet,
                lab,
                body,
                processing,
                results,
                contacts,
                frames,
                orthoses,
                exchanged,
                Optional.empty());
    }

    /** With every label on its own marker. */
    public Trial(
            String file,
            String condition,
            MarkerSet markerSet,
            LabSettings lab,
            BodySettings body,
            Processing processing,
            ResultSettings results,
            Optional<List<ContactRule>> contacts,
            Optional<FrameRange> frames,
            List<Orthosis> orthoses) {
        this(file, condition, markerSet, lab, body, processing, results, contacts, frames, orthoses, List.of());
    }
}
