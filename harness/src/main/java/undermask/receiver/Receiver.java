package undermask.receiver;

import undermask.signal.Lines;

public final class Receiver {
    public static Receiver of(ReceiverStandard standard) {
        throw new UnsupportedOperationException();
    }

    public Trace scan(Lines lines) {
        throw new UnsupportedOperationException();
    }
}
