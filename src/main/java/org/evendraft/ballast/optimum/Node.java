package org.evendraft.ballast.optimum;

import java.util.ArrayList;
import java.util.List;

/**
 * A node of the tree: what is still open to each tank.
 *
 * @param open the open stretches of each tank
 * @param basis a basis that is dual feasible for them
 * @param bound no plan in the node is better than this
 * @param depth how many decisions led here
 * @param number its place in the order of making, which breaks ties
 */
record Node(List<List<Span>> open, List<Column> basis, double bound, int depth, int number) {

    static Node root(Program program) {
        List<List<Span>> open = new ArrayList<>();
        for (int t = 0; t < program.model().tanks().size(); t++) {
            int tank = t;
            List<Span> spans = new ArrayList<>();
            for (int c = 0; c < program.model().tanks().get(tank).choices().size(); c++) {
                Span span = Span.whole(program, tank, c);
                if (!span.empty()) {
                    spans.add(span);
                }
            }
            open.add(List.copyOf(spans));
        }
        return new Node(open, List.of(program.linear().logicals), Double.NEGATIVE_INFINITY, 0, 0);
    }

    /** All columns that may be used. */
    List<Column> columns(Program program) {
        List<Column> columns = new ArrayList<>(program.free());
        for (List<Span> spans : open) {
            for (Span span : spans) {
                span.columns.forEach(columns::addAll);
            }
        }
        return columns;
    }

    Node with(int tank, List<Span> spans, List<Column> start, double newBound, int newNumber) {
        List<List<Span>> changed = new ArrayList<>(open);
        changed.set(tank, spans);
        return new Node(changed, start, newBound, depth + 1, newNumber);
    }

    Node with(List<List<Span>> changed, List<Column> start, double newBound) {
        return new Node(changed, start, newBound, depth, number);
    }
}
