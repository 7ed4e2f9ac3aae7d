package saltspoke.advice;

import saltspoke.values.Note;

/**
 * What one change of habit or part would buy for the pairing in focus.
 *
 * @param what the change, as a note such as {@code change-storage-heated-room}
 * @param field profile field or part kind that changes, such as {@code storage} or {@code nipple}
 * @param value the new value there
 * @param firstLookMonths first look with the change
 * @param everyMonths interval with the change
 * @param factor new first look (limits of practice off) over the old
 * @param cost {@code free}, {@code minutes}, {@code parts} or {@code rebuild}
 */
public record Change(
    Note what,
    String field,
    String value,
    double firstLookMonths,
    double everyMonths,
    double factor,
    String cost) {}
