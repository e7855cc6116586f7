package undermask.network;

import java.util.List;
import undermask.installation.Installation;
import undermask.signal.Transfer;

public final class InstallationNetwork {
    public static InstallationNetwork of(Installation installation, MainsNetwork mains) {
        throw new UnsupportedOperationException();
    }

    /** Common-mode source to receiver port, one per mains line whose reading can differ; symmetrical lines share one. */
    public List<Transfer> commonModeTransfers() {
        throw new UnsupportedOperationException();
    }
}
