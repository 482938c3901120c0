/** Nobody with an account has this id. */
export class UnknownPersonError extends Error {
	readonly code = 'unknown_person';
	override readonly name = 'UnknownPersonError';
	constructor() {
		super('Nobody here has this number.');
	}
}

/** Somebody else has changed the person since they were shown. */
export class ChangedMeanwhileError extends Error {
	readonly code = 'changed_meanwhile';
	override readonly name = 'ChangedMeanwhileError';
	constructor() {
		super('Somebody else has changed this meanwhile.');
	}
}

/** Nobody decides about their own role or pause. */
export class OwnAccountError extends Error {
	readonly code = 'own_account';
	override readonly name = 'OwnAccountError';
	constructor() {
		super('Nobody decides about their own account.');
	}
}
