package org.rolltrace.core.propeller;

/** What is said of the propellers: the power they get, or just the moments they make. */
public sealed interface PropellerSetting permits PowerSetting, PropellerMoments {}
