package org.evendraft.store;

/** What every contract below needs: a database of the engine under test, open for the whole class. */
interface StoreContract {
    Database database();
}
