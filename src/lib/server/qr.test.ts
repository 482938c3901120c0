import { create } from 'qrcode';
import { describe, expect, it } from 'vitest';
import { qrDrawing } from './qr';

describe('a QR code', () => {
	it('is drawn module for module, with four light ones around it', () => {
		const text = 'otpauth://totp/Tallyplate:ann?secret=JBSWY3DPEHPK3PXP';
		const { size, data } = create(text, { errorCorrectionLevel: 'M' }).modules;
		const { side, path } = qrDrawing(text);
		expect(side).toBe(size + 8);
		const dark = [...path.matchAll(/M(\d+) (\d+)h1v1h-1z/g)];
		expect(dark).toHaveLength([...data].filter(Boolean).length);
		for (const [, x, y] of dark) expect(data[(Number(y) - 4) * size + Number(x) - 4]).toBeTruthy();
	});
});
