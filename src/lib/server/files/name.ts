const LENGTH = 200;

/**
 * The name that somebody's machine gave a file, as text: no path, one line, no signs that cannot be seen or that turn
 * the direction of what follows. Whatever else stands in it is shown as it is.
 * @example fileName('C:\\photos\\plate.jpg') // 'plate.jpg'
 */
export function fileName(given: string): string {
	const shown = given.normalize('NFC').replace(/[\p{Cc}\p{Cf}\p{Cs}\p{Zl}\p{Zp}]/gu, '');
	const last = shown.split(/[/\\]/).at(-1)?.trim() ?? '';
	const characters = [...(last || 'file')];
	if (characters.length <= LENGTH) return characters.join('');
	// The ending says more than the middle.
	const ending = /\.[^.]{1,8}$/u.exec(last)?.[0] ?? '';
	return characters.slice(0, LENGTH - [...ending].length).join('') + ending;
}
