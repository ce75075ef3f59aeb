/** For tests; the build itself is plain JavaScript. */
export function build(workspaces?: ("api" | "web")[]): Promise<void>;
