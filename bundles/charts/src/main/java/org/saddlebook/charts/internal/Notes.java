package org.saddlebook.charts.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** The cautions drawn with a figure. */
final class Notes {
    /**
     * A numbered note.
     *
     * @param number place of the caution in the map handed in, from 1, so that a report's figures carry its own numbers
     * @param text what it says
     */
    record Note(int number, String text) {}

    private Notes() {}

    /** One note per id, in order of their numbers; a caution without a text is drawn with its id rather than dropped. */
    static List<Note> of(List<String> ids, Map<String, String> cautions) {
        List<Note> notes = new ArrayList<>();
        int number = 0;
        for (Map.Entry<String, String> caution : cautions.entrySet()) {
            number++;
            if (ids.contains(caution.getKey())) {
                notes.add(new Note(number, caution.getValue()));
            }
        }
        for (int i = 0; i < ids.size(); i++) {
            if (!cautions.containsKey(ids.get(i)) && ids.indexOf(ids.get(i)) == i) {
                notes.add(new Note(++number, ids.get(i)));
            }
        }
        return notes;
    }
}
