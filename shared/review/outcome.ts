/** A refusal is data: a stable code for programs, one plain sentence for people. */
export type Refusal = { readonly refused: string; readonly detail: string };
export type Accepted<T> = { readonly accepted: T };
export type Outcome<T> = Accepted<T> | Refusal;

export const accept = <T>(value: T): Accepted<T> => ({ accepted: value });
export const refuse = (refused: string, detail: string): Refusal => ({ refused, detail });
export const isRefusal = <T>(outcome: Outcome<T>): outcome is Refusal => 'refused' in outcome;
