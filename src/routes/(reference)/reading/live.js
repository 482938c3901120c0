/**
 * What script adds to the reading page, which works without it and ships no framework: the touched group is
 * lit in both places, arrows lead along the stamp, the kind is named while typing, the drawing follows maker and
 * year, the address is written the usual way at once, and a link can be copied. Listeners sit on the document, so
 * nothing has to be bound again when a part is replaced.
 */
const { documentElement: root } = document;

/** Longest code that stands alone. */
const CODE = 5;
/** Shortest serial number less one. */
const SHORT = 9;

/**
 * What a text looks like while it is being typed: how many places it has, counted as the reader counts them,
 * and the name of the sentence about it; null when nothing can be struck. A first word: the reading decides.
 * @param {string} text
 * @returns {{ places: number, kind: 'code' | 'sequence' | 'short' | 'serial' | 'seventeen' | 'long' } | null}
 * @example looksLike('*RH23L0E[38]04127*') // { places: 13, kind: 'serial' }
 */
export function looksLike(text) {
	const struck = text.toUpperCase().replace(/^[\s*]+|[\s*]+$|[^A-Z0-9?_*[\]]/g, '');
	const places = (struck.match(/\[[^\]]*\]|[^[\]]/g) ?? []).length;
	if (places === 0) return null;
	if (/^\d{6}$/.test(struck)) return { places, kind: 'sequence' };
	if (places <= CODE) return { places, kind: 'code' };
	if (places <= SHORT) return { places, kind: 'short' };
	if (places === 17) return { places, kind: 'seventeen' };
	return { places, kind: places > 17 ? 'long' : 'serial' };
}

/** @param {EventTarget | null} target @param {string} selector */
const within = (target, selector) =>
	target instanceof Element ? /** @type {HTMLElement | null} */ (target.closest(selector)) : null;

/** The group that an element belongs to: a link of the stamp, or its field. @param {EventTarget | null} target */
const groupOf = (target) => within(target, '[data-group]')?.dataset['group'];

/** Lights a group in the stamp, in its leader and in its field. @param {string | undefined} group */
function light(group) {
	if (group === undefined) return;
	for (const part of document.querySelectorAll('[data-group]'))
		part.classList.toggle(
			'lit',
			part instanceof Element && part.getAttribute('data-group') === group
		);
}

/** Says under the field what it looks like. @param {HTMLInputElement} field */
function nameKind(field) {
	const said = field.form?.querySelector('[data-sentences]');
	if (!(said instanceof HTMLElement)) return;
	/** @type {Record<string, string>} */
	const sentences = JSON.parse(said.dataset['sentences'] ?? '{}');
	const like = looksLike(field.value);
	said.textContent =
		like === null ? '' : (sentences[like.kind] ?? '').replace('{n}', String(like.places));
}

/** The address that a form asks for, parts in the usual order. @param {HTMLFormElement} form */
function addressOf(form) {
	const data = new FormData(form);
	const parts = ['kind', 'text', 'maker', 'year', 'edition']
		.map((name) => [name, String(data.get(name) ?? '')])
		.filter(([, value]) => value !== '')
		.map(([name, value]) => `${name}=${encodeURIComponent(value ?? '')}`);
	return `/?${parts.join('&')}`;
}

/** Fetches the drawing for another maker or year and puts it in place. @param {HTMLFormElement} form */
async function followMaker(form) {
	const plan = document.querySelector('[data-plan]');
	if (plan === null) return;
	const data = new FormData(form);
	const [maker, year] = [String(data.get('maker')), String(data.get('year'))];
	const answer = await fetch(`/?${new URLSearchParams({ maker, year })}`);
	if (!answer.ok) return;
	const page = new DOMParser().parseFromString(await answer.text(), 'text/html');
	const other = page.querySelector('[data-plan]');
	// The last choice counts, whichever answer comes first.
	const now = new FormData(form);
	if (other !== null && now.get('maker') === maker && now.get('year') === year)
		plan.replaceWith(other);
}

/** @param {HTMLElement} button */
async function copyLink(button) {
	const said = document.getElementById('said');
	const { address = '', copied = '', refused = '' } = button.dataset;
	let sentence = copied;
	try {
		await navigator.clipboard.writeText(new URL(address, location.href).href);
	} catch {
		// The browser may forbid it; the permanent address stands beside the button.
		sentence = refused;
	}
	if (said !== null) said.textContent = sentence;
}

/** Arrows lead from group to group, as along a plate. @param {KeyboardEvent} event */
function alongStamp(event) {
	const ahead = { ArrowRight: 1, ArrowLeft: -1 }[event.key];
	const link = within(event.target, 'a[data-group]');
	if (ahead === undefined || link === null) return;
	const links = [...document.querySelectorAll('a[data-group]')];
	const next = links[links.indexOf(link) + ahead];
	if (!(next instanceof HTMLElement)) return;
	event.preventDefault();
	next.focus();
}

/** "/" goes to the field from anywhere on the page. @param {KeyboardEvent} event */
function toField(event) {
	if (event.key !== '/' || event.ctrlKey || event.metaKey || event.altKey) return;
	const field = document.getElementById('text');
	if (!(field instanceof HTMLInputElement) || within(event.target, 'input, select, textarea'))
		return;
	event.preventDefault();
	field.focus();
	field.select();
}

function begin() {
	root.classList.add('live');
	light(location.hash.slice(1) || undefined);
	document.addEventListener('focusin', ({ target }) => light(groupOf(target)));
	document.addEventListener('pointerover', ({ target, pointerType }) => {
		if (pointerType === 'mouse') light(groupOf(target));
	});
	document.addEventListener('click', ({ target }) => {
		light(groupOf(target));
		const button = within(target, '[data-act]');
		if (button?.dataset['act'] === 'copy') void copyLink(button);
		if (button?.dataset['act'] === 'print') print();
	});
	document.addEventListener('keydown', (event) => {
		alongStamp(event);
		toField(event);
	});
	document.addEventListener('input', ({ target }) => {
		if (target instanceof HTMLInputElement && target.id === 'text') nameKind(target);
	});
	document.addEventListener('change', ({ target }) => {
		if (target instanceof HTMLSelectElement && target.form !== null) void followMaker(target.form);
	});
	document.addEventListener('submit', (event) => {
		const form = event.target;
		if (!(form instanceof HTMLFormElement) || new FormData(form).get('text') === '') return;
		if (new URL(form.action).pathname !== '/') return;
		event.preventDefault();
		location.assign(addressOf(form));
	});
}

if (!root.classList.contains('live')) begin();
