/**
 * What a manoeuvre, flown or computed, looked like against time: samples with name and unit, in SI.
 */
package org.rolltrace.core.history;
