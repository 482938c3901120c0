/** Who works on something, and until when nobody else may. */
export interface Lease {
	readonly worker: string;
	readonly until: Date;
}
