import { z } from 'zod';

// The content policy forbids building functions from text, which zod would otherwise try for speed.
z.config({ jitless: true });
