/** What a barge master or an engineer asks for, one class for each verb of the trade; neither HTTP nor SQL. */
@NullMarked
package org.evendraft.service;

import org.jspecify.annotations.NullMarked;
