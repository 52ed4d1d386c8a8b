package treadwork.model.study;

import java.util.List;
import java.util.Optional;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;

/**
 * @param up        empty: found from plates and markers
 * @param pointUnit empty: the file's own
 * @param plates    empty: those of the file; else these replace them
 */
public record LabSettings(Optional<LabAxis> up, Optional<LengthUnit> pointUnit, Optional<List<Plate>> plates) {

    public static final LabSettings DEFAULT = new LabSettings(Optional.empty(), Optional.empty(), Optional.empty());

    public LabSettings {
        plates = plates.map(List::copyOf);
    }
}
