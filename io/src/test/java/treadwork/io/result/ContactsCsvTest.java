package treadwork.io.result;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.StringWriter;
import org.junit.jupiter.api.Test;

class ContactsCsvTest {

    /** By construction of {@link Results}: frame 103 is 2/200 s after frame 101. */
    @Test
    void aContactHasARowAFrame() throws IOException {
        StringWriter writer = new StringWriter();

        ContactsCsv.write(Results.rightAnkle(10), writer);

        assertEquals("""
                frame,time_s,plate,foot,fx_N,fy_N,fz_N,cop_x_m,cop_y_m,cop_z_m,free_moment_Nm\r
                103,0.01,2,left,1.5,-3,700,0.1,0.2,0,-0.25\r
                104,0.015,2,left,2.5,-4,710,,,,\r
                """, writer.toString());
    }
}
