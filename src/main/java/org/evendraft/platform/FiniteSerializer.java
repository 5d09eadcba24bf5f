package org.evendraft.platform;

import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.databind.SerializerProvider;
import com.fasterxml.jackson.databind.ser.std.StdSerializer;
import java.io.IOException;

/** Writes a number, or {@code null} where there is none to tell: JSON has no spelling for what is not finite. */
final class FiniteSerializer extends StdSerializer<Double> {
    private static final long serialVersionUID = 1L;

    FiniteSerializer() {
        super(Double.class);
    }

    @Override
    public void serialize(Double value, JsonGenerator out, SerializerProvider provider) throws IOException {
        if (Double.isFinite(value)) {
            out.writeNumber(value);
        } else {
            out.writeNull();
        }
    }
}
