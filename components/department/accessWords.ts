const places: Readonly<Record<string, string>> = { 'GET /api/department/visit': 'a visit: a sample of work, under a pseudonym' }

/** Where a record was looked at, in words; a route without any stands as it is. */
export const routeText = (route: string): string => places[route] ?? route
