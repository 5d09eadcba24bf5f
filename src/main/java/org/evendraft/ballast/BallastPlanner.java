package org.evendraft.ballast;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.evendraft.ballast.Plan.Optimality;
import org.evendraft.platform.Caution;
import org.evendraft.platform.Condition;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.stability.ConditionResult;
import org.evendraft.stability.Evaluation;

/** Makes ballast plans; see the package's description. Pure: the same question has the same plan. Safe from many threads. */
public final class BallastPlanner {
    /** A plan within this part of the bound counts as proven. */
    private static final double PROVEN = 1e-3;

    private BallastPlanner() {}

    /**
     * The cheapest plan that reaches the target; the nearest one, not feasible, when there is none.
     *
     * @throws FaultyDocumentException when the platform sinks or capsizes as it is, or a ballast tank that may be moved holds something other
     *     than the condition's sea water
     */
    public static Plan plan(PreparedPlatform prepared, Condition condition, PlanRequest request) {
        ConditionResult before = Evaluation.evaluate(prepared, condition);
        Plant plant = new Plant(prepared, condition, request);
        ExactState start = ExactState.of(plant.loaded())
                .orElseThrow(() -> FaultyDocumentException.impossible("", "The platform does not float as it is."));
        Found found = new TargetSearch(plant, request)
                .run()
                .orElseThrow(() -> new IllegalStateException("not even moving nothing is a plan"));
        List<Transfer> transfers = Transfer.of(plant, found.plan().flows());
        Schedule schedule = new Ordering(plant, request.operationLimits(), start).best(transfers);
        Path path = Path.follow(plant, schedule, request.operationLimits(), Path.CLOSE);
        return new Report(plant, request, found, schedule, path, new Explanation(plant, start)).plan(before);
    }

    /** Puts an answer together. */
    private record Report(
            Plant plant, PlanRequest request, Found found, Schedule schedule, Path path, Explanation explanation) {

        Plan plan(ConditionResult before) {
            ConditionResult after =
                    Evaluation.evaluate(plant.prepared(), found.end().condition());
            double pumped = schedule.runs().stream()
                    .mapToDouble(run -> run.transfer().mass())
                    .sum();
            List<Plan.EndFill> fills = fills();
            int slack = slackTanks();
            double cost = pumped
                    + request.objective().touchPenalty() * fills.size()
                    + request.objective().slackPenalty() * slack;
            return new Plan(
                    found.end().deviation().none() && path.kept(),
                    moves(),
                    fills,
                    before,
                    after,
                    pumped,
                    fills.size(),
                    slack,
                    cost,
                    schedule.duration(),
                    worst(),
                    optimality(cost),
                    Stream.concat(found.end().deviation().binding().stream(), path.limitsPassed().stream())
                            .toList(),
                    warnings(after),
                    Caution.TEXT);
        }

        private List<Plan.EndFill> fills() {
            List<Plan.EndFill> fills = new ArrayList<>();
            for (int t = 0; t < plant.tanks().size(); t++) {
                BallastTank tank = plant.tanks().get(t);
                double mass = found.end().masses().get(t);
                if (mass != tank.start()) {
                    fills.add(new Plan.EndFill(tank.id(), mass, tank.density()));
                }
            }
            return fills;
        }

        private int slackTanks() {
            int slack = plant.slackOthers();
            for (int t = 0; t < plant.tanks().size(); t++) {
                slack += plant.tanks().get(t).slack(found.end().masses().get(t)) ? 1 : 0;
            }
            return slack;
        }

        private List<Move> moves() {
            List<Move> moves = new ArrayList<>();
            for (Schedule.Run run : schedule.runs()) {
                Transfer transfer = run.transfer();
                moves.add(new Move(
                        moves.size() + 1,
                        transfer.from(),
                        transfer.to(),
                        transfer.mass(),
                        transfer.mass() / plant.water().density(),
                        run.pump(),
                        run.start(),
                        run.end(),
                        after(path.after(run)),
                        explanation.of(transfer)));
            }
            return moves;
        }

        private Move.After after(ExactState state) {
            return new Move.After(
                    state.waterplane().draft(),
                    state.waterplane().heelAngle(),
                    state.waterplane().trimAngle(),
                    state.gmTransverse(),
                    state.gmLongitudinal(),
                    Evaluation.marks(plant.prepared(), state.waterplane()));
        }

        private Plan.Worst worst() {
            return new Plan.Worst(
                    path.worst(Quantity.GM_TRANSVERSE),
                    path.worst(Quantity.GM_LONGITUDINAL),
                    path.worst(Quantity.HEEL),
                    path.worst(Quantity.TRIM));
        }

        private Optimality optimality(double cost) {
            double others = request.objective().slackPenalty() * plant.slackOthers();
            double bound = Math.max(0, Math.min(cost, found.bound() + others));
            double gap = cost > 0 ? (cost - bound) / cost : 0;
            return new Optimality(bound, gap, gap <= PROVEN);
        }

        private List<String> warnings(ConditionResult after) {
            List<String> warnings = new ArrayList<>(path.violations());
            found.end()
                    .deviation()
                    .binding()
                    .forEach(binding -> warnings.add(String.format(
                            Locale.ROOT,
                            "The target cannot be met: %s comes to %.3f where %.3f is asked for, %.3f short.",
                            binding.limit(),
                            binding.value(),
                            binding.bound(),
                            binding.lack())));
            after.warnings().forEach(warning -> warnings.add("At the end: " + warning));
            return warnings;
        }
    }
}
