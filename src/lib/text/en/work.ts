import type { JobState } from '../../types';

/** The page of what is being done for somebody in the background. */
export const workText = {
	title: 'Your work',
	intro:
		'What takes long is done in the background. You can leave; it goes on, and stands here for thirty days.',
	crumbs: 'The way to this page',
	nothing: 'Nothing is being done for you',
	nothingBody: 'When a file is checked or a list is read, it stands here with how far it is.',
	nothingOffer: { name: 'Your files', address: '/account/files' },
	listed: 'Work in the background, newest first',
	/** What is done, by its kind. */
	kinds: { check_file: 'Check of a file' } as Readonly<Record<string, string>>,
	otherKind: 'Work',
	states: {
		due: 'waits its turn',
		running: 'being done',
		done: 'done',
		failed: 'could not be done',
		stopped: 'stopped'
	} satisfies Record<JobState, string>,
	stopping: 'is being stopped',
	again: 'waits to be tried again',
	progress: (done: string, of: string) => `${done} of ${of} steps`,
	progressLabel: (kind: string) => `${kind}: how far it is`,
	asked: (moment: string) => `asked for ${moment}`,
	ended: (moment: string) => `ended ${moment}`,
	stop: 'Stop',
	stopNamed: (kind: string, moment: string) => `Stop: ${kind}, asked for ${moment}`,
	refresh: 'Show how far it is now',
	stopped: 'It ends as soon as it can.'
} as const;
