package org.evendraft.service;

import java.time.Clock;
import java.util.function.Supplier;
import org.evendraft.store.ConditionRepository;
import org.evendraft.store.Database;
import org.evendraft.store.IdempotencyRepository;
import org.evendraft.store.LoadPlanRepository;
import org.evendraft.store.PlanRepository;
import org.evendraft.store.PlatformRepository;
import org.evendraft.store.SoundingRepository;

/** Everything that can be asked of the service, put together over a database. */
public final class ControlRoom {
    private final Once once;
    private final StorePlatform storePlatform;
    private final ReadPlatforms readPlatforms;
    private final ReadHydrostatics readHydrostatics;
    private final RecordSoundings recordSoundings;
    private final ReadSoundings readSoundings;
    private final ReadTankStates readTankStates;
    private final EvaluateCondition evaluateCondition;
    private final StoreCondition storeCondition;
    private final ReadConditions readConditions;
    private final TankTableFile tankTableFile;
    private final MakePlan makePlan;
    private final ReadPlans readPlans;
    private final MakeLoadPlan makeLoadPlan;
    private final ReadLoadPlans readLoadPlans;
    private final ComputeRighting computeRighting;
    private final Jobs jobs;
    private final JudgeStability judgeStability;
    private final JudgeDamage judgeDamage;
    private final ComputeAllowableKg computeAllowableKg;
    private final CheckHealth checkHealth;

    /**
     * @param database where everything is kept
     * @param clock tells the time
     * @param ids makes ids, UUIDs
     * @param engineVersion version of the program
     */
    public ControlRoom(Database database, Clock clock, Supplier<String> ids, String engineVersion) {
        Provenance.Source source = new Provenance.Source(clock, engineVersion);
        PlatformRepository platforms = new PlatformRepository(clock);
        ConditionRepository conditions = new ConditionRepository(clock, ids);
        SoundingRepository soundings = new SoundingRepository(clock, ids);
        PlatformShelf shelf = new PlatformShelf(database, platforms);
        this.once = new Once(database, new IdempotencyRepository(clock));
        this.storePlatform = new StorePlatform(platforms);
        this.readPlatforms = new ReadPlatforms(database, platforms, shelf);
        this.readHydrostatics = new ReadHydrostatics(shelf, source);
        this.recordSoundings = new RecordSoundings(shelf, soundings, clock);
        this.readSoundings = new ReadSoundings(database, shelf, soundings);
        this.readTankStates = new ReadTankStates(database, shelf, soundings, clock);
        LatestFills latestFills = new LatestFills(readTankStates);
        this.evaluateCondition = new EvaluateCondition(shelf, latestFills, source);
        this.storeCondition = new StoreCondition(evaluateCondition, conditions);
        this.readConditions = new ReadConditions(database, shelf, conditions);
        this.tankTableFile = new TankTableFile(shelf, storePlatform);
        PlanRepository plans = new PlanRepository(clock, ids);
        this.makePlan = new MakePlan(shelf, readConditions, plans, source);
        this.readPlans = new ReadPlans(database, readConditions, plans);
        LoadPlanRepository loadPlans = new LoadPlanRepository(clock, ids);
        this.readLoadPlans = new ReadLoadPlans(database, shelf, loadPlans);
        this.makeLoadPlan = new MakeLoadPlan(shelf, readConditions, readLoadPlans, latestFills, loadPlans, source);
        this.jobs = new Jobs(database, clock, ids);
        Loadings loadings = new Loadings(shelf, evaluateCondition, readConditions);
        this.computeRighting = new ComputeRighting(loadings, source);
        this.judgeStability = new JudgeStability(loadings, source);
        this.judgeDamage = new JudgeDamage(loadings, jobs, source);
        this.computeAllowableKg = new ComputeAllowableKg(shelf, storePlatform, jobs, source);
        this.checkHealth = new CheckHealth(database, engineVersion);
    }

    /** Carries writes out once. */
    public Once once() {
        return once;
    }

    /** Stores platforms. */
    public StorePlatform storePlatform() {
        return storePlatform;
    }

    /** Reads platforms. */
    public ReadPlatforms readPlatforms() {
        return readPlatforms;
    }

    /** Reads hydrostatics. */
    public ReadHydrostatics readHydrostatics() {
        return readHydrostatics;
    }

    /** Records soundings. */
    public RecordSoundings recordSoundings() {
        return recordSoundings;
    }

    /** Reads the history of soundings. */
    public ReadSoundings readSoundings() {
        return readSoundings;
    }

    /** Reads the tanks' states. */
    public ReadTankStates readTankStates() {
        return readTankStates;
    }

    /** Evaluates conditions. */
    public EvaluateCondition evaluateCondition() {
        return evaluateCondition;
    }

    /** Stores conditions. */
    public StoreCondition storeCondition() {
        return storeCondition;
    }

    /** Reads conditions. */
    public ReadConditions readConditions() {
        return readConditions;
    }

    /** Reads and replaces calibration tables. */
    public TankTableFile tankTableFile() {
        return tankTableFile;
    }

    /** Makes plans. */
    public MakePlan makePlan() {
        return makePlan;
    }

    /** Reads plans. */
    public ReadPlans readPlans() {
        return readPlans;
    }

    /** Makes load plans. */
    public MakeLoadPlan makeLoadPlan() {
        return makeLoadPlan;
    }

    /** Reads load plans. */
    public ReadLoadPlans readLoadPlans() {
        return readLoadPlans;
    }

    /** Computes righting arms. */
    public ComputeRighting computeRighting() {
        return computeRighting;
    }

    /** Works on long computations, from {@link Jobs#begin} on. */
    public Jobs jobs() {
        return jobs;
    }

    /** Judges stability. */
    public JudgeStability judgeStability() {
        return judgeStability;
    }

    /** Judges damage. */
    public JudgeDamage judgeDamage() {
        return judgeDamage;
    }

    /** Computes the greatest KG. */
    public ComputeAllowableKg computeAllowableKg() {
        return computeAllowableKg;
    }

    /** Checks health. */
    public CheckHealth checkHealth() {
        return checkHealth;
    }
}
