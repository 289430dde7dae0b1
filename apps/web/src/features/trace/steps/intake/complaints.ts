/** The complaints to choose from; their words are in the catalogue. */
export const complaints = ['blows', 'some', 'comesAndGoes', 'tester', 'other'] as const;

export type Complaint = (typeof complaints)[number];

export function isComplaint(id: string | null): id is Complaint {
  return (complaints as readonly (string | null)[]).includes(id);
}
