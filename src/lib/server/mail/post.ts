/** A mail on its way out. */
export interface OutgoingMail {
	readonly to: string;
	readonly messageId: string;
	readonly subject: string;
	readonly text: string;
	readonly html: string | null;
	readonly unsubscribe: string | null;
	readonly date: Date;
}

/** Takes mails away. */
export interface Post {
	/**
	 * Hands one mail over; done when the other side has taken it.
	 * @throws {RefusedMailError} it will never be taken; anything else may pass
	 */
	send(mail: OutgoingMail): Promise<void>;
}

/** The other side refuses this mail for good, as for an address that does not exist. */
export class RefusedMailError extends Error {
	readonly code = 'mail_refused';
	override readonly name = 'RefusedMailError';
}

const CONNECTION_TIMEOUT_MS = 10_000;
const SOCKET_TIMEOUT_MS = 30_000;
/** Shorter than the lease on a mail, so that nobody else begins while it is still being sent. */
export const SEND_TIMEOUT_MS = 60_000;

/** What the mail library says went wrong: a code of its own, and the server's number when it spoke. */
interface SendError extends Error {
	readonly code?: string;
	readonly responseCode?: number;
}

/** Only an answer about this very mail: a server that refuses to let us in refuses nobody's mail. */
const isRefusal = ({ code, responseCode = 0 }: SendError): boolean =>
	(code === 'EENVELOPE' || code === 'EMESSAGE') && responseCode >= 500 && responseCode < 600;

/**
 * Sends over SMTP, a connection for each mail: a pool may send once more of its own accord.
 * @param from an address, perhaps with a name before it
 */
export function smtpPost(smtpUrl: string, from: string): Post {
	return {
		async send(mail) {
			// The processes that serve only queue.
			const { createTransport } = await import('nodemailer');
			const transport = createTransport({
				url: smtpUrl,
				connectionTimeout: CONNECTION_TIMEOUT_MS,
				greetingTimeout: CONNECTION_TIMEOUT_MS,
				socketTimeout: SOCKET_TIMEOUT_MS,
				// What stands in a mail is never an address of ours to be fetched, or a file to be read.
				disableFileAccess: true,
				disableUrlAccess: true
			});
			let timer: NodeJS.Timeout | undefined;
			const late = new Promise<never>((_, reject) => {
				timer = setTimeout(
					() => reject(new Error(`The mail server took over ${SEND_TIMEOUT_MS / 1000} s.`)),
					SEND_TIMEOUT_MS
				);
			});
			try {
				await Promise.race([transport.sendMail(messageOf(mail, from)), late]);
			} catch (error) {
				const { message } = error as Error;
				throw isRefusal(error as SendError)
					? new RefusedMailError(message, { cause: error })
					: error;
			} finally {
				clearTimeout(timer);
				transport.close();
			}
		}
	};
}

const messageOf = (mail: OutgoingMail, from: string) => ({
	from,
	// As an object it is one address, whatever signs stand in it.
	to: { name: '', address: mail.to },
	subject: mail.subject,
	text: mail.text,
	...(mail.html !== null && { html: mail.html }),
	messageId: mail.messageId,
	date: mail.date,
	headers: {
		// Nobody's absence note should answer, or be answered (RFC 3834).
		'Auto-Submitted': 'auto-generated',
		...(mail.unsubscribe !== null && {
			'List-Unsubscribe': `<${mail.unsubscribe}>`,
			'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click'
		})
	}
});
