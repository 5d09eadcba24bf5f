package org.evendraft.ballast.optimum;

import com.google.ortools.Loader;
import com.google.ortools.linearsolver.MPConstraint;
import com.google.ortools.linearsolver.MPObjective;
import com.google.ortools.linearsolver.MPSolver;
import com.google.ortools.linearsolver.MPSolverParameters;
import com.google.ortools.linearsolver.MPVariable;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The same question put to a general solver (HiGHS in OR-Tools) in another form: a switch for each segment of each line, and flows of
 * each tank through each pump bounded by those switches.
 */
final class IndependentSolver {
    private static final double GAP = 1e-7;

    private final Model model;
    private final MPSolver solver;
    private final MPConstraint[] effects;
    private final MPConstraint[] balances;
    private final MPObjective objective;

    static {
        Loader.loadNativeLibraries();
    }

    private IndependentSolver(Model model) {
        this.model = model;
        this.solver = MPSolver.createSolver("HIGHS");
        this.objective = solver.objective();
        this.effects = new MPConstraint[model.rows().size()];
        for (int r = 0; r < effects.length; r++) {
            effects[r] = solver.makeConstraint(
                    -MPSolver.infinity(), model.rows().get(r).bound());
        }
        this.balances = new MPConstraint[model.pumps().size()];
        for (int p = 0; p < balances.length; p++) {
            balances[p] = solver.makeConstraint(0, 0);
        }
    }

    /** The least cost, empty when the rows cannot be met. */
    static OptionalDouble leastCost(Model model) {
        IndependentSolver solver = new IndependentSolver(model);
        return solver.solve();
    }

    private OptionalDouble solve() {
        for (int p = 0; p < balances.length; p++) {
            sea(p);
        }
        for (TankModel tank : model.tanks()) {
            tank(tank);
        }
        objective.setMinimization();
        MPSolverParameters parameters = new MPSolverParameters();
        parameters.setDoubleParam(MPSolverParameters.DoubleParam.RELATIVE_MIP_GAP, GAP);
        MPSolver.ResultStatus status = solver.solve(parameters);
        OptionalDouble cost = switch (status) {
            case OPTIMAL -> OptionalDouble.of(objective.value());
            case INFEASIBLE -> OptionalDouble.empty();
            default -> throw new IllegalStateException("the general solver ended with " + status);
        };
        solver.delete();
        return cost;
    }

    private void sea(int pump) {
        double most = 1e5;
        MPVariable drawn = solver.makeNumVar(0, model.pumps().get(pump).draws() ? most : 0, "");
        MPVariable put = solver.makeNumVar(0, model.pumps().get(pump).discharges() ? most : 0, "");
        balances[pump].setCoefficient(drawn, 1);
        balances[pump].setCoefficient(put, -1);
        objective.setCoefficient(drawn, 1);
    }

    private void tank(TankModel tank) {
        MPConstraint one = solver.makeConstraint(1, 1);
        MPConstraint gain = solver.makeConstraint(0, 0);
        List<MPVariable> filling = new ArrayList<>();
        List<MPVariable> drawing = new ArrayList<>();
        double most = 0;
        for (Choice choice : tank.choices()) {
            for (int i = 0; i < Math.max(1, choice.points().size() - 1); i++) {
                Point low = choice.points().get(i);
                Point high = choice.points().get(Math.min(i + 1, choice.points().size() - 1));
                MPVariable on = segment(choice, low, high, one, gain);
                (low.amount() + high.amount() > 0 ? filling : drawing).add(on);
                most = Math.max(most, Math.max(Math.abs(low.amount()), Math.abs(high.amount())));
            }
        }
        flows(tank.filledBy(), filling, most, 1, gain);
        flows(tank.drawnBy(), drawing, most, -1, gain);
    }

    private MPVariable segment(Choice choice, Point low, Point high, MPConstraint one, MPConstraint gain) {
        MPVariable on = solver.makeBoolVar("");
        MPVariable part = solver.makeNumVar(0, 1, "");
        MPConstraint within = solver.makeConstraint(-MPSolver.infinity(), 0);
        within.setCoefficient(part, 1);
        within.setCoefficient(on, -1);
        one.setCoefficient(on, 1);
        objective.setCoefficient(on, choice.fixedCost());
        gain.setCoefficient(on, low.amount());
        gain.setCoefficient(part, high.amount() - low.amount());
        for (int r = 0; r < effects.length; r++) {
            effects[r].setCoefficient(on, low.effect(r));
            effects[r].setCoefficient(part, high.effect(r) - low.effect(r));
        }
        return on;
    }

    /** Flows through pumps, nil unless one of the segments of that direction is on. */
    private void flows(List<Integer> pumps, List<MPVariable> segments, double most, int sign, MPConstraint gain) {
        for (int pump : pumps) {
            MPVariable flow = solver.makeNumVar(0, most, "");
            MPConstraint allowed = solver.makeConstraint(-MPSolver.infinity(), 0);
            allowed.setCoefficient(flow, 1);
            segments.forEach(segment -> allowed.setCoefficient(segment, -most));
            gain.setCoefficient(flow, -sign);
            balances[pump].setCoefficient(flow, -sign);
            if (sign < 0) {
                objective.setCoefficient(flow, 1);
            }
        }
    }
}
