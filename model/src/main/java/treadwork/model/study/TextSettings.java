package treadwork.model.study;

import java.util.List;
import java.util.Optional;

/**
 * What a person says of captures that are delimited text, since such files state little of themselves.
 *
 * @param pointRateHz frames a second, Hz; empty: from the file
 * @param plateRateHz rows a second in the plates' own file, Hz; empty: from the file
 * @param channels    names of the columns that are the analog channels, in the order in which a plate's channels count
 *                    them; empty: every column of numbers that is neither marker, time nor frame
 */
public record TextSettings(Optional<Double> pointRateHz, Optional<Double> plateRateHz, List<String> channels) {

    /** Everything from the file. */
    public static final TextSettings DEFAULT = new TextSettings(Optional.empty(), Optional.empty(), List.of());

    public TextSettings {
        channels = List.copyOf(channels);
    }
}
