/** Address or password is not right; which of them is never told. */
export class WrongSignInError extends Error {
	readonly code = 'wrong_sign_in';
	override readonly name = 'WrongSignInError';
	constructor() {
		super('Address and password do not belong together.');
	}
}

/** A link that was never ours, was used before, or has lapsed: which of them is never told. */
export class LapsedLinkError extends Error {
	readonly code = 'lapsed_link';
	override readonly name = 'LapsedLinkError';
	constructor() {
		super('This link was used before, or has lapsed.');
	}
}

/** The password that has to be given again is not right. */
export class WrongPasswordError extends Error {
	readonly code = 'wrong_password';
	override readonly name = 'WrongPasswordError';
	constructor() {
		super('This is not the password of the account.');
	}
}

/** A code that is not right, not of now, or was taken before. */
export class WrongCodeError extends Error {
	readonly code = 'wrong_code';
	override readonly name = 'WrongCodeError';
	constructor() {
		super('This code is not right, or was used before.');
	}
}

/** A session that is not theirs, or is at its end. */
export class UnknownSessionError extends Error {
	readonly code = 'unknown_session';
	override readonly name = 'UnknownSessionError';
	constructor() {
		super('There is no such session.');
	}
}

/** The last administrator cannot leave: nobody would be left to appoint another. */
export class LastAdministratorError extends Error {
	readonly code = 'last_administrator';
	override readonly name = 'LastAdministratorError';
	constructor() {
		super('The last administrator cannot leave.');
	}
}

/** A second factor that is in force, or is not, where the other is needed. */
export class FactorStateError extends Error {
	readonly code = 'factor_state';
	override readonly name = 'FactorStateError';
	constructor() {
		super('The second factor does not stand as this needs it.');
	}
}
