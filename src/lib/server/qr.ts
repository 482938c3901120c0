import { create } from 'qrcode';

/** A QR code as a drawing: the side in modules, quiet zone included, and one path for all dark ones. */
export interface QrDrawing {
	readonly side: number;
	readonly path: string;
}

/** Light modules around the code that cameras ask for. */
const QUIET = 4;

/** Draws a text as a QR code. Our own drawing: what the library writes as SVG would have to be trusted as markup. */
export function qrDrawing(text: string): QrDrawing {
	const { size, data } = create(text, { errorCorrectionLevel: 'M' }).modules;
	let path = '';
	for (let row = 0; row < size; row += 1)
		for (let column = 0; column < size; column += 1)
			if (data[row * size + column]) path += `M${column + QUIET} ${row + QUIET}h1v1h-1z`;
	return { side: size + 2 * QUIET, path };
}
