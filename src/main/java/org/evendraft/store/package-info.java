/**
 * What is kept, in H2 or PostgreSQL: platforms by revision, soundings, conditions with their results, plans, jobs, and answers
 * to requests that may be repeated. Repositories work on a Jdbi handle, so that a use case composes several in one transaction
 * of {@link org.evendraft.store.Database}. Units and axes as everywhere: m, t, t/m³, degrees, minutes; times are UTC and kept
 * to the microsecond.
 */
@NullMarked
package org.evendraft.store;

import org.jspecify.annotations.NullMarked;
