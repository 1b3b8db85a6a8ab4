/** An answer that a browser saves under this name. */
export function csvResponse(csv: string, fileName: string): Response {
  return new Response(csv, {
    headers: {
      'content-type': 'text/csv; charset=utf-8; header=present',
      'content-disposition': `attachment; filename="${fileName}"`,
      'cache-control': 'no-store',
    },
  });
}
