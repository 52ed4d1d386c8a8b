package treadwork.solver.cli;

import picocli.CommandLine.ITypeConverter;
import treadwork.solver.run.Selection;

/** Reads what follows {@code --only}. */
final class SelectionConverter implements ITypeConverter<Selection> {

    @Override
    public Selection convert(String text) {
        return Selection.parse(text);
    }
}
