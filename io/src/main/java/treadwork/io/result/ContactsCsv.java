package treadwork.io.result;

import java.io.IOException;
import java.io.Writer;
import java.util.List;
import treadwork.model.load.Contact;
import treadwork.model.load.ContactSeries;
import treadwork.model.load.TrialResult;
import treadwork.model.space.VectorSeries;

/** {@code contacts.csv}: a row a contact and frame, the reaction on the foot in lab axes. */
public final class ContactsCsv {

    private static final List<String> COLUMNS = List.of(
            "frame",
            "time_s",
            "plate",
            "foot",
            "fx_N",
            "fy_N",
            "fz_N",
            "cop_x_m",
            "cop_y_m",
            "cop_z_m",
            "free_moment_Nm");

    private ContactsCsv() {}

    /** Writes the table, contact after contact; values that are not known are empty cells. The writer is flushed, not closed. */
    public static void write(TrialResult result, Writer writer) throws IOException {
        CsvText csv = new CsvText(writer);
        csv.header(COLUMNS);
        for (ContactSeries series : result.contacts()) {
            rows(series, result, csv);
        }
        csv.end();
    }

    private static void rows(ContactSeries series, TrialResult result, CsvText csv) throws IOException {
        Contact contact = series.contact();
        for (int i = 0; i < series.force().size(); i++) {
            int frame = contact.frames().first() + i;
            csv.cell(frame);
            csv.cell(result.timeOf(frame - result.firstFrame()));
            csv.cell(contact.plate());
            csv.cell(contact.foot().key());
            cells(series.force(), i, csv);
            cells(series.centreOfPressure(), i, csv);
            csv.cell(series.freeMoment().at(i));
            csv.endRow();
        }
    }

    private static void cells(VectorSeries series, int i, CsvText csv) throws IOException {
        csv.cell(series.x(i));
        csv.cell(series.y(i));
        csv.cell(series.z(i));
    }
}
