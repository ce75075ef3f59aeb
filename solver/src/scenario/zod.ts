import { config, z } from "zod";

// The content policy forbids `new Function`, which zod probes for unless told not to: this must run before the first
// schema is made, so every schema of the product takes `z` from here (lint forbids importing zod elsewhere).
config({ jitless: true });

export { z };
