package treadwork.model.study;

import java.util.List;
import java.util.Optional;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;

/**
 * @param up          empty: found from plates and markers
 * @param pointUnit   empty: the file's own
 * @param plates      empty: those of the file, or the named ones; else these replace them
 * @param text        what holds for captures that are delimited text
 * @param namedPlates where there are any, they replace those of the file when it is read; then {@code plates} is empty
 */
public record LabSettings(
        Optional<LabAxis> up,
        Optional<LengthUnit> pointUnit,
        Optional<List<Plate>> plates,
        TextSettings text,
        List<NamedPlate> namedPlates) {

    public static final LabSettings DEFAULT = new LabSettings(Optional.empty(), Optional.empty(), Optional.empty());

    public LabSettings {
        plates = plates.map(List::copyOf);
        namedPlates = List.copyOf(namedPlates);
        if (plates.isPresent() && !namedPlates.isEmpty()) {
            throw new IllegalArgumentException("the plates are given with channel numbers and with names");
        }
    }

    /** With text captures that say all of themselves. */
    public LabSettings(Optional<LabAxis> up, Optional<LengthUnit> pointUnit, Optional<List<Plate>> plates) {
        this(up, pointUnit, plates, TextSettings.DEFAULT, List.of());
    }
}
