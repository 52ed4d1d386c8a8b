package treadwork.io.text;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.finding.NearestName;
import treadwork.model.space.ScalarSeries;

/** The columns of a table that are analog channels. */
final class Channels {

    private final Table table;

    Channels(Table table) {
        this.table = table;
    }

    /** Those that a person names, in that order. */
    List<String> named(List<String> channels) {
        List<String> names = table.header.names();
        for (String name : channels) {
            if (!names.contains(name.strip())) {
                throw Refusal.of(
                        "text-column-unknown",
                        table.source.file,
                        "it has no column \"" + name + "\"" + NearestName.hint(name, names),
                        "Correct lab.text.channels in the study file");
            }
        }
        return channels.stream().map(String::strip).toList();
    }

    /** Every column that is neither time, frame nor marker. */
    List<String> guessed(Optional<Markers> markers, Notes notes) {
        List<String> names = new ArrayList<>();
        for (int i = 0; i < table.header.names().size(); i++) {
            int column = i;
            if (!table.header.counts(i)
                    && !table.header.names().get(i).isEmpty()
                    && markers.filter(each -> each.hold(column)).isEmpty()) {
                names.add(table.header.names().get(i));
            }
        }
        if (!names.isEmpty()) {
            notes.guessed(
                    "text-channels",
                    "no channels are named, " + names.size() + " columns are taken as such: " + Notes.listed(names),
                    "Plates that are given by channel numbers count in this order");
        }
        return names;
    }

    List<AnalogChannel> of(List<String> names, int samples) {
        List<AnalogChannel> channels = new ArrayList<>();
        for (String name : names) {
            int column = table.header.names().indexOf(name);
            channels.add(new AnalogChannel(
                    name,
                    table.header.units().get(column),
                    ScalarSeries.of(Arrays.copyOf(table.column(column), samples))));
        }
        return channels;
    }
}
