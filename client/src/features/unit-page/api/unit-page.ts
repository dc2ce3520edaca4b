import { queryOptions } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';

export type PublicUnit = Dto<'PublicUnitDto'>;

export const publicUnitQuery = (token: string) =>
  queryOptions({
    queryKey: ['unit-page', token] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/unit-pages/{token}', { params: { path: { token } }, signal })),
  });
