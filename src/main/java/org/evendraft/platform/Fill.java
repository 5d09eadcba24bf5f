package org.evendraft.platform;

/**
 * What a tank holds, however the document spelt it.
 *
 * @param tank the tank's id
 * @param volume volume of the liquid, at most the tank's full volume (m³)
 * @param density its density (t/m³)
 */
public record Fill(String tank, double volume, double density) {

    /** Mass of the liquid (t). */
    public double mass() {
        return volume * density;
    }
}
