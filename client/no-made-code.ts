import { z } from 'zod';

/** The policy of the page forbids code made from text: schemas are read as they stand, and nothing is tried out. */
z.config({ jitless: true });
