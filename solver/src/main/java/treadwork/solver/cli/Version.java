package treadwork.solver.cli;

import picocli.CommandLine.IVersionProvider;
import treadwork.solver.run.ProgramVersion;

/** What {@code --version} prints. */
final class Version implements IVersionProvider {

    @Override
    public String[] getVersion() {
        return new String[] {"treadwork " + ProgramVersion.TEXT};
    }
}
