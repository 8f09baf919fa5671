type Report = {
  testResults: {
    name: string;
    status: string;
    assertionResults: { status: string; fullName: string }[];
  }[];
};
type Counts = { passed: number; failed: number; reasons: string[] };
export function countResults(options: { name: string; code: number; report: Report | null }): Counts;
