package org.evendraft.ballast;

import java.util.ArrayList;
import java.util.List;
import org.evendraft.ballast.optimum.Model;
import org.evendraft.ballast.optimum.Optimum;
import org.evendraft.ballast.optimum.Point;
import org.evendraft.ballast.optimum.TankModel;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Pump;

/** The optimiser's model of a target, and what its answers mean. Immutable. */
final class TargetModel {
    /** Tanks whose middles mirror each other within this are twins (m). */
    private static final double MIRROR = 0.05;
    /** Amounts closer than this to an end of what a choice allows are that end (t). */
    private static final double AT_END = 1e-7;

    private final Plant plant;
    private final List<Coupling> rows;
    private final Model model;

    TargetModel(Plant plant, List<Coupling> rows, PlanRequest.Objective objective) {
        this.plant = plant;
        this.rows = List.copyOf(rows);
        List<TankModel> tanks = new ArrayList<>();
        for (int t = 0; t < plant.tanks().size(); t++) {
            BallastTank tank = plant.tanks().get(t);
            tanks.add(new TankModel(
                    tank.id(),
                    new TankLine(tank, rows, objective).choices(),
                    serving(tank.id(), true),
                    serving(tank.id(), false),
                    twin(t)));
        }
        List<Model.SeaEnds> ends = plant.groups().stream()
                .map(group -> new Model.SeaEnds(
                        group.from().contains(Pump.SEA), group.to().contains(Pump.SEA)))
                .toList();
        this.model = new Model(tanks, ends, modelRows(new double[rows.size()]));
    }

    private List<Integer> serving(String id, boolean filling) {
        List<Integer> serving = new ArrayList<>();
        for (int p = 0; p < plant.groups().size(); p++) {
            PumpGroup group = plant.groups().get(p);
            if ((filling ? group.to() : group.from()).contains(id)) {
                serving.add(p);
            }
        }
        return serving;
    }

    private int twin(int t) {
        Vec3 mine = middle(t);
        for (int other = 0; other < plant.tanks().size(); other++) {
            Vec3 its = middle(other);
            if (other != t && new Vec3(mine.x() - its.x(), mine.y() + its.y(), mine.z() - its.z()).norm() < MIRROR) {
                return other;
            }
        }
        return t;
    }

    private Vec3 middle(int t) {
        BallastTank tank = plant.tanks().get(t);
        return tank.calibration().holding(tank.calibration().fullVolume()).centre();
    }

    private List<Model.Row> modelRows(double[] corrections) {
        List<Model.Row> result = new ArrayList<>();
        for (int r = 0; r < rows.size(); r++) {
            Coupling row = rows.get(r);
            result.add(new Model.Row(row.room() - corrections[r], row.weight()));
        }
        return result;
    }

    /** The model, each row's bound lowered by what the exact state was seen to be more than the model said. */
    Model model(double[] corrections) {
        return model.withRows(modelRows(corrections));
    }

    int size() {
        return rows.size();
    }

    /** How much more over each bound the exact state is than the model says of the plan. */
    double[] errors(Optimum plan, ExactState state) {
        double[] sum = new double[rows.size()];
        for (int t = 0; t < plan.amounts().size(); t++) {
            Point.addEffects(
                    model.tanks().get(t).choices().get(plan.choices().get(t)).points(),
                    plan.amounts().get(t),
                    sum);
        }
        for (int r = 0; r < sum.length; r++) {
            sum[r] = rows.get(r).over(state) - (sum[r] - rows.get(r).room());
        }
        return sum;
    }

    /** The masses at the end of a plan, set right at the ends of what each choice allows (t). */
    double[] masses(Optimum plan) {
        double[] masses = new double[plan.amounts().size()];
        for (int t = 0; t < masses.length; t++) {
            List<Point> line =
                    model.tanks().get(t).choices().get(plan.choices().get(t)).points();
            double amount = plan.amounts().get(t);
            for (Point end : List.of(line.get(0), line.get(line.size() - 1))) {
                amount = Math.abs(amount - end.amount()) < AT_END ? end.amount() : amount;
            }
            masses[t] = plant.tanks().get(t).start() + amount;
        }
        return masses;
    }
}
