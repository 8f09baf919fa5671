export function buildChildPrograms(root: string): Promise<string>;
