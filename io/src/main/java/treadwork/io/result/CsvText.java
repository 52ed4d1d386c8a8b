package treadwork.io.result;

import java.io.IOException;
import java.io.Writer;
import java.util.List;

/** A table as RFC 4180 has it: commas between cells, CR LF after each row; no cell of ours needs quoting. */
final class CsvText {

    private final Writer writer;
    private final char[] text = new char[1 << 14];
    private int size;
    private boolean rowIsEmpty = true;

    CsvText(Writer writer) {
        this.writer = writer;
    }

    void header(List<String> names) throws IOException {
        for (String name : names) {
            cell(name);
        }
        endRow();
    }

    /** A number; an empty cell where it is not known. */
    void cell(double value) throws IOException {
        begin(NumberText.LONGEST);
        size = NumberText.put(value, text, size);
    }

    void cell(String word) throws IOException {
        begin(word.length());
        word.getChars(0, word.length(), text, size);
        size += word.length();
    }

    void endRow() throws IOException {
        room(2);
        text[size++] = '\r';
        text[size++] = '\n';
        rowIsEmpty = true;
    }

    /** Hands on what is still held; the writer stays open. */
    void end() throws IOException {
        writer.write(text, 0, size);
        size = 0;
        writer.flush();
    }

    private void begin(int length) throws IOException {
        room(length + 1);
        if (!rowIsEmpty) {
            text[size++] = ',';
        }
        rowIsEmpty = false;
    }

    private void room(int length) throws IOException {
        if (size + length > text.length) {
            writer.write(text, 0, size);
            size = 0;
        }
    }
}
