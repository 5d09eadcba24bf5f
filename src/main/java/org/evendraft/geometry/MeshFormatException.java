package org.evendraft.geometry;

import java.io.IOException;

/** A file that holds no mesh in the form that its name tells; the message says where it goes wrong. */
public final class MeshFormatException extends IOException {
    private static final long serialVersionUID = 1L;

    MeshFormatException(String message) {
        super(message);
    }
}
