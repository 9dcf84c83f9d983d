/**
 * Every file that is read or written.
 *
 * <p>{@link org.rolltrace.core.files.ScenarioFile} and {@link
 * org.rolltrace.core.files.AeroplaneFile} turn files into values in SI units and radians, or refuse
 * them with a {@link org.rolltrace.core.files.FileFaultsException} that lists everything that is
 * wrong, each with file, path, line and the way out. {@link
 * org.rolltrace.core.files.ScenarioDocument} is a scenario file to be edited: its values stay as
 * they are written, right or wrong, and it can be checked without being saved. {@link
 * org.rolltrace.core.files.Schemas} hands out the same formats as JSON Schemas.
 *
 * <h2>Common to all</h2>
 *
 * <p>JSON by RFC 8259 in UTF-8, one object a file; a byte-order mark is skipped. Nothing more is
 * forgiven: no comments, no trailing commas, nothing after the closing brace, no key twice. A file
 * has at most 1 MiB, 32 levels of nesting and 20 000 values, a text at most 2000 characters. At
 * most 200 faults are listed; the rest is counted.
 *
 * <p>A quantity is text: a decimal number, a space, a unit, by the grammar of {@link
 * org.rolltrace.core.quantity}. A bare number stands only where the quantity has no unit. What is
 * marked * must be there.
 *
 * <h2>Scenario, {@code rolltrace-scenario/1}</h2>
 *
 * <table>
 *   <caption>Keys of a scenario</caption>
 *   <tr><th>key</th><th>value</th></tr>
 *   <tr><td>format*</td><td>{@code rolltrace-scenario/1}</td></tr>
 *   <tr><td>title*</td><td>text, up to 200 characters</td></tr>
 *   <tr><td>note</td><td>text, not looked at</td></tr>
 *   <tr><td>aeroplane*</td><td>the path of an aeroplane file from the directory of the scenario, or
 *       the aeroplane itself</td></tr>
 *   <tr><td>variant</td><td>the name of a variant of that aeroplane, up to 200 characters: it is flown
 *       in place of the base, and what it replaces is not looked at</td></tr>
 *   <tr><td>condition*</td><td>a condition, below</td></tr>
 *   <tr><td>slip*</td><td>{@code held}, {@code settled} or {@code free}</td></tr>
 *   <tr><td>heldSlip</td><td>list of held slips, below; up to 1000, straight between them, the first
 *       one before and the last one after them: the sideslip that the pilot holds, with held slip
 *       only; none when absent. The trim is that without slip</td></tr>
 *   <tr><td>start</td><td>{@code bank} (right wing down positive), {@code rollRate} (rolling right),
 *       {@code sideslip} (wind from the right): displacements from the trimmed state, 0 when absent;
 *       {@code trim}: {@code state}: {@code wings-level} (default), {@code straight-sideslip} with
 *       either {@code sideslip} or {@code bank}, or {@code steady-turn} with {@code bank}, these
 *       inside 90 deg either way; and {@code power} or {@code propellerRollMoment}, the one trimmed
 *       with, in the way of the condition, that of the condition when absent. With held slip a straight sideslip is held all the time</td></tr>
 *   <tr><td>inputs</td><td>list of inputs, below; up to 200, none when absent; those on one control
 *       add up</td></tr>
 *   <tr><td>duration*</td><td>time above 0, up to 3600 s</td></tr>
 *   <tr><td>measures</td><td>{@code settlingBand}: number, 0.001 to 0.5, 0.05 when absent; {@code
 *       bankAngles}: list of up to 100 angles above 0, up to 3600 deg, beside 30, 45, 60 and 90
 *       deg</td></tr>
 * </table>
 *
 * <table>
 *   <caption>Keys of a condition</caption>
 *   <tr><th>key</th><th>value</th></tr>
 *   <tr><td>pressureAltitude*</td><td>length, −5000 m to 20 000 m</td></tr>
 *   <tr><td>temperatureOffset</td><td>temperature difference from the standard day; 0 K when
 *       absent</td></tr>
 *   <tr><td>density</td><td>density, instead of temperatureOffset</td></tr>
 *   <tr><td>trueAirspeed, equivalentAirspeed, calibratedAirspeed</td><td>speed above 0 and below
 *       Mach 1; exactly one of the three*</td></tr>
 *   <tr><td>loadFactor</td><td>number; when absent the cosine of the flight-path angle, in a
 *       steady turn divided by that of the bank</td></tr>
 *   <tr><td>flightPathAngle</td><td>angle inside ±90 deg, positive climbing; 0 when absent</td></tr>
 *   <tr><td>power</td><td>power of all propellers together, from 0 to the rated one; not in {@code
 *       validAt} of derivatives, as the two below</td></tr>
 *   <tr><td>propellerSpeed</td><td>angular rate above 0 of the propellers with that power; of each
 *       its own when absent</td></tr>
 *   <tr><td>propellerRollMoment</td><td>moment instead of power, right wing down positive; 0 when
 *       both are absent</td></tr>
 * </table>
 *
 * <table>
 *   <caption>Keys of an input</caption>
 *   <tr><th>key</th><th>value</th></tr>
 *   <tr><td>control*</td><td>{@code stick}, {@code pedal} or {@code power}: all levers together;
 *       needs a power of the condition, and stops at 0 and at the rated power</td></tr>
 *   <tr><td>shape*</td><td>{@code step} (stays), {@code hold} (and then back), {@code doublet} (to
 *       one side, the other, and back), {@code multistep} (to either side by turns, 3-2-1-1),
 *       {@code ramp} (slowly, and stays), {@code sweep} (a sine of changing frequency), {@code
 *       trace} (as recorded)</td></tr>
 *   <tr><td>start*</td><td>time of the first movement, 0 or more; of trace, which may do without,
 *       what is added to its times, 0 s when absent</td></tr>
 *   <tr><td>size*</td><td>number, −1 to 1: fraction of the travel, right positive, or of
 *       the rated power, more positive; of sweep
 *       how far it goes to each side, of trace, which may do without, a factor, 1 when absent</td></tr>
 *   <tr><td>movement, not of ramp, sweep and trace</td><td>time that the hand takes for a move, 0 or more; 0.1 s when absent, 0 s
 *       for a jump</td></tr>
 *   <tr><td>duration*, of hold only</td><td>time from the start to the beginning of the return, not
 *       below the movement</td></tr>
 *   <tr><td>width*, of doublet only</td><td>time from one move to the next, not below the
 *       movement</td></tr>
 *   <tr><td>unit*, pattern, of multistep only</td><td>time of one unit, not below the movement; list
 *       of up to 100 whole numbers from 1 to 1000, the units it stays at each side, {@code [3, 2, 1,
 *       1]} when absent</td></tr>
 *   <tr><td>duration*, of ramp</td><td>time above 0 that the hand takes from the trimmed position to
 *       the size</td></tr>
 *   <tr><td>from*, to*, duration*, law, of sweep</td><td>frequencies above 0 and up to 20 Hz, as
 *       cycles ({@code Hz}) or angles ({@code rad/s}) per time; time above 0 from one to the other;
 *       {@code linear} (default) or {@code logarithmic}. The sine ends with its first passage
 *       through zero after the duration</td></tr>
 *   <tr><td>file*, column*, of trace only</td><td>the path of a CSV file from the directory of the
 *       scenario; the name of a column there, below</td></tr>
 *   <tr><td>cutBefore, cutAfter, of trace only</td><td>times in that file; what is before the one and
 *       after the other is not flown</td></tr>
 * </table>
 *
 * <table>
 *   <caption>Keys of a held slip</caption>
 *   <tr><th>key</th><th>value</th></tr>
 *   <tr><td>time*</td><td>time, 0 or more, increasing from point to point</td></tr>
 *   <tr><td>sideslip*</td><td>angle, wind from the right positive, up to 90 deg either way</td></tr>
 * </table>
 *
 * <h2>Trace, CSV</h2>
 *
 * <p>UTF-8, values separated by commas, without quotation marks. The first line names the columns
 * and their units, {@code time[s],stick[-],pedal[%]}; one is called {@code time}, in a unit of
 * time, and increases from line to line. The column of the movement is a fraction {@code [-]} or
 * per cent {@code [%]} of the travel, right positive; times the size it stays within the travel.
 * Other columns are not looked at. At least two lines of numbers follow, at most 100 000, 1 MiB in
 * all. Between samples the movement is straight, before the first it is at the trimmed position,
 * after the last it stays where that one is.
 *
 * <h2>Aeroplane, {@code rolltrace-aeroplane/1}</h2>
 *
 * <table>
 *   <caption>Keys of an aeroplane</caption>
 *   <tr><th>key</th><th>value</th></tr>
 *   <tr><td>format*</td><td>{@code rolltrace-aeroplane/1}; may be absent inside a scenario</td></tr>
 *   <tr><td>name</td><td>text, up to 200 characters</td></tr>
 *   <tr><td>note</td><td>text, not looked at</td></tr>
 *   <tr><td>span*, wingArea*, mass</td><td>length, area, mass; above 0. With a wing, span and area
 *       follow from its panels and may be absent, or are the same to 0.1 %. With masses the mass may
 *       be absent, or is the same to 1 %. Settled and free slip need the mass, and so does a
 *       wing</td></tr>
 *   <tr><td>wing, tailplane, fin, body</td><td>the shape, below; tailplane and fin need a wing</td></tr>
 *   <tr><td>masses</td><td>list of masses, below, 1 to 500</td></tr>
 *   <tr><td>variants</td><td>changed aeroplanes, below</td></tr>
 *   <tr><td>lateralImbalance</td><td>{@code mass}* above 0 and {@code arm}*, positive to the right:
 *       fuel or stores on one side only, which the mass counts and the inertia does not</td></tr>
 *   <tr><td>inertia*</td><td>may be absent where there are masses, or mass and body, from which it is
 *       estimated by {@linkplain org.rolltrace.core.aeroplane.RadiiOfGyration radii of gyration};
 *       a given one wins; {@code roll}* Ixx and {@code yaw} Izz, above 0, {@code product} Ixz with
 *       Ixz² &lt; Ixx Izz, 0 when absent. Settled and free slip need yaw</td></tr>
 *   <tr><td>ailerons</td><td>{@code up}* above 0 and {@code down}* from 0, up to 90 deg: travel of
 *       each; {@code rateLimit}: angular rate above 0; {@code lag}: time, 0 or 0.1 ms and more; with a
 *       wing, and then all three or none: {@code from}, {@code to}: lengths from the plane of symmetry
 *       to the ends, inside the wing, and {@code chordShare}: number above 0 and below 1, their chord
 *       behind the hinge by that of the wing</td></tr>
 *   <tr><td>rudder</td><td>{@code left}*, {@code right}* above 0, up to 90 deg; {@code rateLimit},
 *       {@code lag}</td></tr>
 *   <tr><td>propellers</td><td>list of propellers, below; up to 20, none when absent</td></tr>
 *   <tr><td>axes</td><td>{@code stability} (default) or {@code body}: the axes of inertia and
 *       derivatives</td></tr>
 *   <tr><td>angleOfAttack</td><td>of body axes*, inside 90 deg either way: inertia and derivatives
 *       are turned by it to stability axes at reading</td></tr>
 *   <tr><td>limits</td><td>{@code manoeuvringSpeed}, {@code neverExceedSpeed} (calibrated
 *       airspeeds), {@code rollingLoadFactor} (number), {@code rollRate}, {@code bank}; above
 *       0</td></tr>
 *   <tr><td>derivatives*</td><td>with a wing they may be absent, and those that are absent in them
 *       follow from it; {@code source}: text; {@code values}: numbers by name,
 *       C{Y,l,n}_{beta,p,r,da,dr}, without a wing 0 when absent; or instead of them {@code dimensional}: quantities
 *       by name, {Y,L,N}_{beta,p,r,da,dr,v}, as {@link org.rolltrace.core.derivatives} has them,
 *       with {@code primed}*: true or false, and {@code validAt}*; {@code per}: {@code radian} (default) or {@code
 *       degree}, for beta, da and dr; {@code aileronSign}: {@code right-roll-positive} (default) or
 *       {@code left-roll-positive}; {@code aileronAngle}: {@code mean} (default), {@code total} or
 *       {@code one-side}; {@code validAt}: a condition</td></tr>
 * </table>
 *
 * <h2>The shape</h2>
 *
 * <p>Lengths lie in the ground plan. {@link org.rolltrace.core.derivatives} has what follows from a
 * shape, in the condition that is flown.
 *
 * <table>
 *   <caption>Keys of a wing</caption>
 *   <tr><th>key</th><th>value</th></tr>
 *   <tr><td>panels*</td><td>list of 1 to 200 panels from the plane of symmetry to the tip, each
 *       beginning where the one before ends; the wing is the same on both sides</td></tr>
 *   <tr><td>section</td><td>the section of all panels that do not give their own</td></tr>
 *   <tr><td>incidence</td><td>angle of the root chord to the x axis of the body, up to 15 deg either
 *       way; 0 deg when absent</td></tr>
 *   <tr><td>height</td><td>length by which the root quarter chord is above the centre line of the
 *       body, negative for a low wing; 0 m when absent</td></tr>
 *   <tr><td>theory</td><td>{@code lifting-surface} (default: nearer to published values) or {@code
 *       lifting-line}</td></tr>
 * </table>
 *
 * <table>
 *   <caption>Keys of a panel</caption>
 *   <tr><th>key</th><th>value</th></tr>
 *   <tr><td>from*, to*</td><td>lengths from the plane of symmetry to its ends, up to 1000 m; the first
 *       begins at 0 m</td></tr>
 *   <tr><td>innerChord*, outerChord*</td><td>lengths from 1 mm to 1000 m; the tip is at most twice as
 *       wide as the root</td></tr>
 *   <tr><td>sweep, dihedral</td><td>angles up to 60 deg either way, of its quarter-chord line; backwards
 *       and upwards positive; 0 deg when absent</td></tr>
 *   <tr><td>twist</td><td>angle up to 15 deg either way by which its outer end has more incidence than
 *       its inner one, negative for washout; 0 deg when absent</td></tr>
 *   <tr><td>section</td><td>its section; what is absent in it is that of the wing</td></tr>
 * </table>
 *
 * <table>
 *   <caption>Keys of a section</caption>
 *   <tr><th>key</th><th>value</th></tr>
 *   <tr><td>liftSlope</td><td>number above 0 and up to 8, per radian at low speed; 2π when
 *       absent</td></tr>
 *   <tr><td>zeroLift</td><td>incidence of the chord without lift, up to 17 deg either way; 0 deg when
 *       absent</td></tr>
 *   <tr><td>stall</td><td>incidence of the chord with the most lift, above 0, up to 60 deg, above
 *       zeroLift; unknown when absent</td></tr>
 *   <tr><td>stallFall</td><td>number, 0 or more: how fast the lift falls beyond it, by how fast it rose
 *       before; 3 when absent</td></tr>
 *   <tr><td>profileDrag</td><td>number, 0 or more; 0.010 when absent</td></tr>
 * </table>
 *
 * <table>
 *   <caption>Keys of tailplane, fin, body and a mass</caption>
 *   <tr><th>of</th><th>keys</th></tr>
 *   <tr><td>tailplane</td><td>{@code area}*, {@code span}*, {@code arm}* from the centre of gravity back
 *       to its quarter chord, above 0; {@code height} above the centre of gravity, 0 m when
 *       absent</td></tr>
 *   <tr><td>fin</td><td>{@code area}* with the rudder, {@code span}*, {@code arm}* back to its
 *       aerodynamic centre, above 0; {@code height}* of that above the centre of gravity, both by the
 *       axes of the body; {@code sweep} up to 70 deg either way, 0 deg when absent; {@code
 *       rudderShare}: number above 0 and below 1, chord of the rudder by that of the fin</td></tr>
 *   <tr><td>body</td><td>{@code length}*, {@code width}*, {@code height}*, the largest, above 0; narrower
 *       than the wing spans</td></tr>
 *   <tr><td>mass</td><td>{@code name}*: text; {@code mass}* above 0; {@code x} forward, {@code y} right,
 *       {@code z} down from any one point in the plane of symmetry; {@code length}, {@code width},
 *       {@code height} over which it is spread evenly, 0 or more; 0 m when absent; {@code pair}: true
 *       when the same is on the other side too, false when absent</td></tr>
 * </table>
 *
 * <p>Masses give inertias about the axes that {@code axes} names; stability axes differ from those
 * of the drawing by the angle of attack, which {@code axes} and {@code angleOfAttack} can say.
 *
 * <h2>Variants</h2>
 *
 * <p>{@code variants} holds up to 50 objects by name. Each has the keys that differ from the base
 * around it, and is merged into it (JSON Merge Patch, RFC 7396): an object is gone into, null takes
 * a key out that the base must have, anything else, lists too, stands in place of what the base
 * has. {@code format} and {@code variants} cannot be changed, and no variant is empty. What comes
 * of it is read as an aeroplane of its own; its name is that of the aeroplane with the variant's in
 * brackets, and its faults begin with "as variant". Reading an aeroplane file reads all of them.
 *
 * <table>
 *   <caption>Keys of a propeller</caption>
 *   <tr><th>key</th><th>value</th></tr>
 *   <tr><td>name*</td><td>text, up to 200 characters, no other propeller's</td></tr>
 *   <tr><td>rotation*</td><td>{@code clockwise}, {@code anticlockwise} (seen from behind) or {@code
 *       contra-rotating}</td></tr>
 *   <tr><td>ratedPower*</td><td>power above 0</td></tr>
 *   <tr><td>speed</td><td>angular rate above 0, of the propeller: the governed one, or with fixed
 *       pitch that at rated power; that of the condition when absent</td></tr>
 *   <tr><td>pitch</td><td>{@code constant-speed} (default) or {@code fixed}: the cube of the speed
 *       grows evenly with the power</td></tr>
 *   <tr><td>speedWithoutPower, of fixed pitch only*</td><td>number above 0 and below 1: part of the
 *       speed at rated power with which the air turns it</td></tr>
 *   <tr><td>gearRatio</td><td>number above 0: turns of the engine for one of the propeller, 1 when
 *       absent</td></tr>
 *   <tr><td>rotatingInertia</td><td>{@code propeller}, {@code engine}: inertias, 0 or more, 0 when
 *       absent</td></tr>
 *   <tr><td>engineRotation</td><td>{@code clockwise} or {@code anticlockwise}; as the propeller when
 *       absent, which a contra-rotating one with an inertia of the engine does not allow</td></tr>
 *   <tr><td>engineLag</td><td>time, 0 or more; 0 s when absent, above 0 with fixed pitch*</td></tr>
 *   <tr><td>position</td><td>{@code x} ahead, {@code y} right, {@code z} below the centre of gravity:
 *       lengths, 0 when absent; no other propeller's</td></tr>
 *   <tr><td>diameter</td><td>length above 0</td></tr>
 *   <tr><td>efficiency</td><td>number above 0 and up to 1; without it there is no thrust</td></tr>
 *   <tr><td>straightened</td><td>number from 0 to 1: part of the slipstream's rotation that wing and
 *       fuselage take out again, 0 when absent</td></tr>
 * </table>
 *
 * <h2>Derivatives, {@code rolltrace-derivatives/1}</h2>
 *
 * <p>Written only. {@code condition}: why this one ({@code basis}), with air and speeds, or a
 * {@code reason} why there is none; {@code base}, and {@code variants} as a list, each with {@code
 * name}, {@code figures} by name ({@code value}, {@code unit}, {@code definition}, or {@code
 * reason}), {@code derivatives} by name ({@code value}, {@code origin}, and where there is one the
 * {@code estimate} with its {@code parts}: {@code part}, {@code value}, {@code method}, {@code
 * extrapolated}), {@code cautions}, and of a variant {@code differsIn} and {@code changes} by name
 * ({@code base}, {@code variant}, {@code difference}, and {@code relative} to the size of the
 * base); {@code methods} by name with {@code what}, {@code source} and {@code knownError}; {@code
 * cautions} of all. {@code loadings} names the file of loads beside it: {@link
 * org.rolltrace.core.files.LoadingsCsv}.
 *
 * <h2>How reading goes</h2>
 *
 * <p>Bytes become text, text a tree of values that know their place, and a cursor walks each object
 * by its table of keys. A fault is noted and reading goes on; values are made only of what is
 * sound. What domain values refuse is noted at the key that brought it in. A key of an object is
 * one word in its table, a shape of input one class and one entry in a list.
 */
package org.rolltrace.core.files;
