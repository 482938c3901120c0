import { describe, expect, it } from 'vitest';
import { readContent } from '../../../../scripts/data/read';
import { zoneOf, ZONES } from './zones';

describe('the place of a row', () => {
	it.each([
		[
			'serial number',
			'On the front (A) pillar of the driver’s side, seen with the door open',
			'pillar'
		],
		['serial plate', 'Lock pillar of the driver’s door', 'lock'],
		[
			'serial plate',
			'Left front body pillar, below the hinge opening of the driver’s door',
			'pillar'
		],
		['serial number', 'Inside the driver’s windshield post, seen from outside', 'post'],
		['public serial number', 'Metal tab on the upper cowl, read through the windshield', 'cowl'],
		['body tag', 'Riveted upright on the firewall near the windshield', 'firewall'],
		['partial serial', 'On the frame and the upper cowl, sometimes in the trunk gutter', 'frame'],
		[
			'engine unit code',
			'Small block: on the machined pad in front of the passenger-side head',
			'front'
		],
		[
			'engine',
			'Engine number on a pad on the right side of the block, to the rear of the engine mount',
			'side-right'
		],
		['engine', 'Part of the serial number on the engine', 'engine'],
		['partial serial', 'On a tag at the rear upper part of the cylinder block', 'rear'],
		['transmission', 'Partial serial number on a pad of the transmission', 'transmission'],
		['axle tag', 'Under a nut of the third member, at about three o’clock', 'axle'],
		['theft label', 'Engine, transmission, both front fenders, hood, doors, trunk, frame', null],
		['second serial stamp', 'A second stamp of the serial under the hood', null]
	])('%s, %s: %s', (part, where, zone) => expect(zoneOf(part, where)).toBe(zone));

	it('is found for nine rows of ten that are released', () => {
		const rows = readContent('data').rows.filter(({ table }) => table === 'stamp_place');
		const zones = rows.map((row) => zoneOf(String(row.values['part']), row.meaning));
		const placed = zones.filter((zone) => zone !== null);
		expect(placed.length / rows.length).toBeGreaterThan(0.9);
		expect(placed.filter((zone) => !ZONES.includes(zone))).toEqual([]);
	});
});
