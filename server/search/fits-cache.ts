import { liesOnBed } from '#shared/fit/fits-bed.ts';
import type { SearchDocument, SearchMachine } from './document.ts';

/** Machines whose answers are kept; the one that was asked for longest ago goes first. */
const machinesKept = 64;

/** Whether a design fits a bed, worked out once for each machine as it was at a version. */
export class FitsCache {
  readonly #answers = new Map<string, Map<string, boolean>>();

  /** A question that can be put to each document in turn. */
  forMachine(machine: SearchMachine): (document: SearchDocument) => boolean {
    const answers = this.#answersFor(`${machine.id} ${machine.version}`);
    return (document) => {
      const known = answers.get(document.id);
      if (known !== undefined) return known;
      const fits = liesOnBed(document.hullMm, document.bitMm ?? undefined, machine);
      answers.set(document.id, fits);
      return fits;
    };
  }

  forget(documentId: string): void {
    for (const answers of this.#answers.values()) answers.delete(documentId);
  }

  clear(): void {
    this.#answers.clear();
  }

  #answersFor(key: string): Map<string, boolean> {
    const answers = this.#answers.get(key) ?? new Map<string, boolean>();
    this.#answers.delete(key);
    this.#answers.set(key, answers);
    for (const oldest of this.#answers.keys()) {
      if (this.#answers.size <= machinesKept) break;
      this.#answers.delete(oldest);
    }
    return answers;
  }
}
