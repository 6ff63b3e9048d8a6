package coilbook.criteria.internal;

import java.util.List;

import coilbook.criteria.Criterion;
import coilbook.criteria.Scope;

/** A criterion whose texts stand in one {@link Description}. */
public abstract class DescribedCriterion implements Criterion {

    private final Description description;

    protected DescribedCriterion(Description description) {
        this.description = description;
    }

    @Override
    public final String id() {
        return description.id();
    }

    @Override
    public final String title() {
        return description.title();
    }

    @Override
    public final String group() {
        return description.group();
    }

    @Override
    public final Scope scope() {
        return description.scope();
    }

    @Override
    public final List<String> needs() {
        return description.needs();
    }

    @Override
    public final String limitSource() {
        return description.limitSource();
    }

    @Override
    public final String hazardRule() {
        return description.hazardRule();
    }

    @Override
    public final String formula() {
        return description.formula();
    }

    @Override
    public final List<String> remedies() {
        return description.remedies();
    }

    /** Begins a finding of this criterion. */
    protected final Judgement judgement() {
        return new Judgement(id());
    }
}
