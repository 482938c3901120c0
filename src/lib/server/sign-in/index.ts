/**
 * Sign-in over the web: Auth.js wired to the accounts. The only part of the server that knows the framework and the
 * library; accounts themselves know neither.
 */
export { auth, LINK_LAPSED, LINK_SENT } from './auth';
export {
	actorOfRequest,
	checkSignIn,
	hasSession,
	ownPath,
	signedIn,
	viewerOf,
	type Viewer
} from './request';
export { waitBeforeEntry } from './pace';
export { askForLink, enterByCode, enterByPassword, leave } from './ways';
