/**
 * Accounts: how somebody gets one, gets in, keeps it safe and leaves. Every function that acts for who is signed
 * in takes the one who asks and begins with its guard; the others act for whoever holds a link or knows a
 * password, and are limited.
 */
export { confirmNewAddress, lookAtNewAddress, requestNewAddress } from './address';
export { deleteOwnAccount, requireOtherAdministrator } from './deletion';
export { DEMO_PASSWORD, demoPeople, ensureDemoPeople, type DemoPerson } from './demo-people';
export { deviceOf } from './device';
export {
	FactorStateError,
	LapsedLinkError,
	LastAdministratorError,
	UnknownSessionError,
	WrongCodeError,
	WrongPasswordError,
	WrongSignInError
} from './errors';
export { LINK_CLEANERS, LINKS } from './links';
export { exportOwnData } from './own-data';
export { changeOwnName, changeOwnPassword, ownAccount, type OwnAccount } from './profile';
export { isReset, requestReset, resetPassword } from './reset';
export {
	confirmFactor,
	offerFactor,
	removeFactor,
	renewRecoveryCodes,
	signInByCode,
	type FactorOffer
} from './second-factor';
export { installationSecret, newSecret } from './secrets';
export { readSessionToken, writeSessionToken } from './session-token';
export {
	actorOf,
	endAllOwnSessions,
	endByCookie,
	endOwnSession,
	openSession,
	ownSessions,
	SESSION_DAYS,
	type SessionShown
} from './sessions';
export { signInByPassword } from './sign-in';
export { sendSignInLink, signInUser, takeLinkRequest, useSignInLink } from './sign-in-link';
export { confirmSignUp, DATA_LICENSE, lookAtSignUp, requestSignUp } from './sign-up';
export { inSteadyTime } from './steady';
