package org.rolltrace.core.run;

import static org.rolltrace.core.derivatives.Coefficient.CL_BETA;
import static org.rolltrace.core.derivatives.Coefficient.CN_BETA;
import static org.rolltrace.core.derivatives.Coefficient.CN_R;
import static org.rolltrace.core.derivatives.Coefficient.CY_BETA;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.motion.LateralModel;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.LateralMotion;
import org.rolltrace.core.motion.SlipTreatment;

/**
 * The modes of the free equations, where the data allow them.
 *
 * @param modes empty when they could not be had
 * @param remark why not; else empty
 */
record FreeModes(Optional<LateralModes> modes, String remark) {
  /** Without any of these the sideslip and yaw of an aeroplane are not described. */
  static final List<Coefficient> NEEDED = List.of(CY_BETA, CL_BETA, CN_BETA, CN_R);

  static FreeModes of(LateralModel model, LateralDerivatives derivatives) {
    List<Coefficient> absent = derivatives.absentAmong(NEEDED);
    if (!model.missingForSlip().isEmpty() || !absent.isEmpty()) {
      String missing = absent.stream().map(Coefficient::symbol).collect(Collectors.joining(", "));
      return new FreeModes(
          Optional.empty(),
          "the free equations need "
              + (model.missingForSlip().isEmpty() || missing.isEmpty()
                  ? model.missingForSlip() + missing
                  : model.missingForSlip() + ", " + missing));
    }
    return new FreeModes(
        Optional.of(LateralModes.of(LateralMotion.of(SlipTreatment.FREE, model))), "");
  }
}
