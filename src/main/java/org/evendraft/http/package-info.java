/** The service over HTTP: routes, problem responses (RFC 9457), health, metrics and the OpenAPI description. No formulas, no SQL. */
@NullMarked
package org.evendraft.http;

import org.jspecify.annotations.NullMarked;
