package org.evendraft.cli;

import org.evendraft.service.ControlRoom;

/** The service with its database, ready to listen. */
public interface Station extends AutoCloseable {

    /** What can be asked of it. */
    ControlRoom controlRoom();

    /** Listens; when it returns, requests are answered. Returns the address. */
    String listen();

    /** Waits until the service has been stopped. */
    void awaitStop();

    /** Lets requests in progress come to their end, then closes the database. Does nothing the second time. */
    @Override
    void close();
}
