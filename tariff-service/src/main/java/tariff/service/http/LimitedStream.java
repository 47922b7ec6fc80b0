// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;

/** A body that may be so long and no longer. */
final class LimitedStream extends FilterInputStream {
    private long left;

    LimitedStream(InputStream in, long mostBytes) {
        super(in);
        this.left = mostBytes;
    }

    /** There is more than is taken. */
    static final class TooLong extends IOException {}

    @Override
    public int read() throws IOException {
        return counted(super.read(), 1);
    }

    @Override
    public int read(byte[] into, int offset, int length) throws IOException {
        int count = super.read(into, offset, length);
        return counted(count, count);
    }

    private int counted(int result, long bytes) throws IOException {
        if (result >= 0) {
            left -= bytes;
            if (left < 0) {
                throw new TooLong();
            }
        }
        return result;
    }
}
