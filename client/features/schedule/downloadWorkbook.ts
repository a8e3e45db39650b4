import { ApiError } from '../../data/ApiError.ts';
import { api } from '../../data/api.ts';
import { routes } from '../../data/routes.ts';

const nameIn = (header: string | null): string => /filename="?([^";]+)"?/.exec(header ?? '')?.[1] ?? 'schedule.xlsx';

/** Fetches the workbook and hands it to the browser as a file; a refusal is an error to be shown, never a page of JSON. */
export async function downloadWorkbook(id: string): Promise<void> {
  let response: Response;
  try {
    response = await fetch(routes.workbook(id), { credentials: 'same-origin' });
  } catch {
    throw new ApiError('offline', 0, 'The server did not answer.');
  }
  // the refusal once more, through the one reader of refusals
  if (!response.ok) await api<unknown>('GET', routes.workbook(id));
  const address = URL.createObjectURL(await response.blob());
  const link = document.createElement('a');
  link.href = address;
  link.download = nameIn(response.headers.get('Content-Disposition'));
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
