import type { RecordValues } from "./record-values";

/** Two pieces of typed work as one, the later over the earlier: nothing of either is lost. */
export function mergeValues(earlier: RecordValues, later: RecordValues): RecordValues {
  return {
    mode: later.mode ?? earlier.mode,
    settings: { ...earlier.settings, ...later.settings },
    flowPattern: later.flowPattern ?? earlier.flowPattern,
    triggerType: later.triggerType ?? earlier.triggerType,
    mechanics: { ...earlier.mechanics, ...later.mechanics },
    hold: later.hold ?? earlier.hold,
    holdReason: later.holdReason || earlier.holdReason,
    endInspiratoryFlowZero: later.endInspiratoryFlowZero ?? earlier.endInspiratoryFlowZero,
    breathStacking: later.breathStacking ?? earlier.breathStacking,
    observations: { ...earlier.observations, ...later.observations },
    reason: later.reason || earlier.reason,
    ownWords: later.reason ? later.ownWords : earlier.ownWords,
    confirmed: [...new Set([...earlier.confirmed, ...later.confirmed])],
  };
}
