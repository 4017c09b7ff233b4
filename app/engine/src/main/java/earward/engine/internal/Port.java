package earward.engine.internal;

import earward.engine.law.DiodeLaw;

/** A carrier-driven device. */
record Port(String part, DiodeLaw law) {}
