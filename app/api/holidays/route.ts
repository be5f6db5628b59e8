import { handle } from '@/lib/http'
import { listCountriesApi } from '@/lib/schemas/holiday'
import { listCountries } from '@/lib/services/public-holidays'

export const GET = handle(listCountriesApi, ({ deps, actor }) => listCountries(deps, actor))
