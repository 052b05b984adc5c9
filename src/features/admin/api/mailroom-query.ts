import { queryOptions } from '@tanstack/react-query'
import { mailroomSchema } from '#shared/schemas/admin'
import type { ApiClient } from '../../../lib/api-client'

export const mailroomQuery = (api: ApiClient) =>
  queryOptions({
    queryKey: ['mailroom'],
    queryFn: async ({ signal }) => mailroomSchema.parse(await api.get('/mailroom', signal)),
  })
