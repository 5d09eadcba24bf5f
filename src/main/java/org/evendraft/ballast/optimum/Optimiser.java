package org.evendraft.ballast.optimum;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.PriorityQueue;

/** Branch and bound over the choices of all tanks; see the package's description. One question each; deterministic. */
public final class Optimiser {
    /** After this many nodes a proven gap of {@link #GOOD_GAP} is good enough. */
    private static final int NODES_FOR_ALL = 3000;
    /** The gap at which a plan counts as proven. */
    private static final double GOOD_GAP = 9e-4;
    /** How often a node is narrowed and solved again. */
    private static final int MOST_NARROWINGS = 4;

    private final Program program;
    private final Completion completion;
    private final Incumbent incumbent;
    private final LocalSearch neighbours;
    private final int mostNodes;
    private final PriorityQueue<Node> open =
            new PriorityQueue<>(Comparator.comparingDouble(Node::bound).thenComparingInt(Node::number));
    private double leftBehind = Double.POSITIVE_INFINITY;
    private int made = 1;
    private int nodes;

    private Optimiser(Model model, Goal goal, int mostNodes) {
        this.program = new Program(model, goal);
        this.completion = new Completion(program);
        this.incumbent = new Incumbent(program);
        this.neighbours = new LocalSearch(program, completion, incumbent);
        this.mostNodes = mostNodes;
    }

    /**
     * Finds the best plan.
     *
     * @param model the question
     * @param goal what is to be least
     * @param mostNodes where to stop with what is known by then
     * @param seeds choices to try first, such as those of a plan for a question like this one
     */
    public static Answer solve(Model model, Goal goal, int mostNodes, List<List<Integer>> seeds) {
        Optimiser search = new Optimiser(model, goal, mostNodes);
        for (List<Integer> seed : seeds) {
            search.incumbent.offer(search.completion.of(seed));
        }
        return search.run();
    }

    /**
     * Finds the best amounts for choices that are made already.
     *
     * @param model the question
     * @param goal what is to be least
     * @param choices the number of each tank's choice
     */
    public static Optional<Optimum> complete(Model model, Goal goal, List<Integer> choices) {
        return new Completion(new Program(model, goal)).of(choices);
    }

    private Answer run() {
        open.add(Node.root(program));
        while (!open.isEmpty() && nodes < mostNodes && !goodEnough()) {
            Node node = open.remove();
            nodes++;
            if (node.bound() < incumbent.cutoff()) {
                look(node);
            }
        }
        neighbours.run();
        return new Answer(incumbent.best(), bound(), nodes);
    }

    private boolean goodEnough() {
        double lowest = open.element().bound();
        return lowest >= incumbent.cutoff() || (nodes >= NODES_FOR_ALL && lowest >= (1 - GOOD_GAP) * incumbent.value());
    }

    /** What no plan is better than: the least bound of all that was not looked through. */
    private double bound() {
        double least = Math.min(leftBehind, incumbent.best().isPresent() ? incumbent.cutoff() : leftBehind);
        for (Node node : open) {
            least = Math.min(least, node.bound());
        }
        return least;
    }

    private void look(Node node) {
        Optional<Relaxed> relaxed = relax(node);
        if (relaxed.isEmpty()) {
            return;
        }
        Reading reading = relaxed.get().reading;
        Node tight = relaxed.get().node;
        boolean better = incumbent.offer(completion.of(rounded(tight, reading)));
        if (better) {
            neighbours.run();
        }
        if (relaxed.get().optimal && reading.whole() && reading.trueToLines()) {
            incumbent.offer(completion.of(rounded(tight, reading)));
            incumbent.offer(Optional.of(reading.optimum()));
            return;
        }
        if (tight.bound() < incumbent.cutoff()) {
            branch(tight, reading);
        }
    }

    private record Relaxed(Node node, Reading reading, boolean optimal) {}

    /** Solves the node's relaxation, narrowing it as long as that helps; empty when nothing better can be in it. */
    private Optional<Relaxed> relax(Node start) {
        Node node = start;
        for (int round = 0; ; round++) {
            List<Column> columns = node.columns(program);
            LpSolution solution = program.linear().solve(columns, node.basis(), incumbent.cutoff());
            if (solution.dropped()) {
                return Optional.empty();
            }
            double here =
                    program.linear().bound(solution.prices, columns, node.open().size());
            double bound = Math.max(node.bound(), here);
            if (bound >= incumbent.cutoff()) {
                return Optional.empty();
            }
            Narrowing narrowing = new Narrowing(program, solution.prices, incumbent.cutoff() - here);
            List<List<Span>> narrowed = narrowing.of(node.open());
            if (narrowed.stream().anyMatch(List::isEmpty)) {
                return Optional.empty();
            }
            node = node.with(narrowed, solution.basis, bound);
            if (!narrowing.changed() || round >= MOST_NARROWINGS || !solution.optimal()) {
                return Optional.of(new Relaxed(node, new Reading(program, solution), solution.optimal()));
            }
        }
    }

    /** For each tank the choice that allows the amount of the relaxation at the least fixed cost. */
    private List<Integer> rounded(Node node, Reading reading) {
        List<Integer> choices = new ArrayList<>();
        for (int t = 0; t < node.open().size(); t++) {
            int single = reading.single(t);
            choices.add(single >= 0 ? single : containing(t, reading.amount(t)));
        }
        return choices;
    }

    private int containing(int tank, double amount) {
        List<Choice> ways = program.model().tanks().get(tank).choices();
        int best = 0;
        for (int c = 1; c < ways.size(); c++) {
            Choice way = ways.get(c);
            if (way.least() <= amount
                    && amount <= way.greatest()
                    && (best == 0 || way.fixedCost() < ways.get(best).fixedCost())) {
                best = c;
            }
        }
        return best;
    }

    private void branch(Node node, Reading reading) {
        Branching.Decision decision = new Branching(program, node, reading).decide();
        if (decision.children().isEmpty()) {
            leftBehind = Math.min(leftBehind, node.bound());
            return;
        }
        for (List<Span> child : decision.children()) {
            if (!child.isEmpty()) {
                open.add(node.with(decision.tank(), child, node.basis(), node.bound(), made++));
            }
        }
    }
}
