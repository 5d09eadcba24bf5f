package org.evendraft.http;

import com.fasterxml.jackson.annotation.JsonInclude;
import com.fasterxml.jackson.annotation.JsonUnwrapped;
import java.util.List;
import java.util.Optional;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.Jobs;
import org.evendraft.service.Reply;
import org.evendraft.store.JobState;
import org.evendraft.store.Page;
import org.evendraft.store.PageRequest;
import org.evendraft.store.StoredJob;

/** Long computations: how far they are, their results, and cancelling them. */
final class JobRoutes {
    static final String JOBS = "/api/v1/jobs";
    static final String JOB = JOBS + "/{job}";

    private static final int OK = 200;

    private final Jobs jobs;

    JobRoutes(ControlRoom room) {
        this.jobs = room.jobs();
    }

    /**
     * A job with the addresses that belong to it.
     *
     * @param job the job
     * @param note what is to be said about the answer, if anything
     * @param links addresses
     */
    private record LinkedJob(
            @JsonUnwrapped StoredJob job,
            @JsonInclude(JsonInclude.Include.NON_ABSENT) Optional<String> note,
            Links links) {

        static LinkedJob of(StoredJob job, Optional<String> note) {
            return new LinkedJob(job, note, Links.of(job));
        }
    }

    /**
     * Addresses of a job.
     *
     * @param self where it stands
     * @param result its result, when it is done
     */
    private record Links(String self, Optional<String> result) {

        static Links of(StoredJob job) {
            String self = JOBS + "/" + job.id();
            return new Links(self, job.state() == JobState.DONE ? Optional.of(self + "/result") : Optional.empty());
        }
    }

    /**
     * Part of the list of jobs.
     *
     * @param jobs the jobs, newest first
     * @param total how many there are in all
     * @param limit the most that were asked for
     * @param offset how many were passed over
     */
    private record JobPage(List<LinkedJob> jobs, long total, int limit, long offset) {}

    List<Route> routes() {
        return List.of(
                Route.get(JOBS, this::list),
                Route.get(JOB, this::one),
                Route.get(JOB + "/result", this::result),
                Route.delete(JOB, this::cancel));
    }

    /** Answers a request that has become a job. */
    static Reply accepted(StoredJob job) {
        LinkedJob linked = LinkedJob.of(job, Optional.empty());
        return Reply.accepted(linked.links().self(), linked);
    }

    private Answer list(Request request) {
        Query query = new Query(request.query());
        Optional<String> platform = query.text("platform");
        PageRequest wanted = query.page();
        query.done();
        Page<LinkedJob> page = jobs.page(platform, wanted).map(job -> LinkedJob.of(job, Optional.empty()));
        return Answer.ok(new JobPage(page.items(), page.total(), wanted.limit(), wanted.offset()));
    }

    private Answer one(Request request) {
        new Query(request.query()).done();
        return Answer.ok(LinkedJob.of(jobs.read(request.variable("job")), Optional.empty()));
    }

    private Answer result(Request request) {
        new Query(request.query()).done();
        return Answer.text(OK, Answer.JSON, jobs.result(request.variable("job")));
    }

    private Answer cancel(Request request) {
        new Query(request.query()).done();
        Jobs.Cancellation cancellation = jobs.cancel(request.variable("job"));
        return Answer.ok(LinkedJob.of(cancellation.job(), cancellation.note()));
    }
}
