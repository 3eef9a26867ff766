/** Files dropped on the page: a craft file is opened, a table of parts goes to the import of parts. */

export type DropKind = 'craft' | 'table' | 'other';

export function dropKind({ name, type }: Pick<File, 'name' | 'type'>): DropKind {
  if (/\.(csv|tsv)$/i.test(name) || type === 'text/csv') return 'table';
  return /\.json$/i.test(name) || type === 'application/json' ? 'craft' : 'other';
}

const hasFiles = ({ dataTransfer }: DragEvent): boolean => dataTransfer?.types.includes('Files') ?? false;

/** Starts taking dropped files, one at a time; returns how to stop. `over` is told whether one hangs above the page. */
export function takeDrops(take: (file: File) => void, over: (above: boolean) => void): () => void {
  const onDragOver = (event: DragEvent) => {
    if (!hasFiles(event)) return;
    event.preventDefault();
    over(true);
  };
  const onDragLeave = (event: DragEvent) => {
    if (event.relatedTarget === null) over(false);
  };
  const onDrop = (event: DragEvent) => {
    if (!hasFiles(event)) return;
    event.preventDefault();
    over(false);
    const [file] = event.dataTransfer!.files;
    if (file) take(file);
  };
  document.addEventListener('dragover', onDragOver);
  document.addEventListener('dragleave', onDragLeave);
  document.addEventListener('drop', onDrop);
  return () => {
    document.removeEventListener('dragover', onDragOver);
    document.removeEventListener('dragleave', onDragLeave);
    document.removeEventListener('drop', onDrop);
  };
}
