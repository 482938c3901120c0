/** Mail: queued in the transaction that causes it, sent by the worker. */
export { queueMail, type Causing, type Mail } from './queue';
