import { correctionsText } from '../../text/en/corrections';

export type RefusalCode = keyof typeof correctionsText.refusals;

/** A correction does not go on this way; `code` says why. */
export class CorrectionRefusedError extends Error {
	override readonly name = 'CorrectionRefusedError';
	constructor(readonly code: RefusalCode) {
		super(correctionsText.refusals[code]);
	}
}
