// Mail server and store of a demonstration, in a process of their own. Started by lib/local-services.mjs.
import { startMailServer } from './mail-server.mjs';
import { startStore } from './store.mjs';

const [mailFolder = '', storeFolder = ''] = process.argv.slice(2);

// Whoever started it is gone, or wants it gone; Ctrl-C in a terminal reaches the starter too.
process.on('disconnect', () => process.exit(0));
process.on('SIGTERM', () => process.exit(0));
process.on('SIGINT', () => {});

const [mail, store] = await Promise.all([startMailServer(mailFolder), startStore(storeFolder)]);
process.send?.({
	SMTP_URL: `smtp://127.0.0.1:${mail.port}`,
	MAILBOX_FOLDER: mailFolder,
	...store.environment
});
