package treadwork.model.study;

import java.util.List;
import java.util.Optional;
import treadwork.model.body.Sex;

/**
 * One subject.
 *
 * @param id         unique in the study; also the name of the results' folder
 * @param massKg     without device, kg
 * @param heightM    m, where stated
 * @param sex        for tables that have one column each
 * @param staticFile path of the standing capture, relative to the study file
 * @param markerSet  labels of the standing capture
 * @param trials     in the file's order
 */
public record Subject(
        String id,
        double massKg,
        Optional<Double> heightM,
        Optional<Sex> sex,
        String staticFile,
        MarkerSet markerSet,
        List<Trial> trials) {

    public Subject {
        trials = List.copyOf(trials);
    }
}
