/** An invented alignment of ring subunits, for a first look: public/samples. Held against its file by a test. */
export const sample = { fileName: 'family-c.afa', family: 'c', rowCount: 10 } as const;
