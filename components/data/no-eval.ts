import { z } from 'zod';

// Zod would try to compile its schemas with `new Function`, which our policy forbids and reports.
// Imported before anything that makes a schema.
z.config({ jitless: true });
