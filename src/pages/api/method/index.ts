import { handlePublic } from '#src/http/handle.ts';
import { listCalculators } from '#src/services/method/listCalculators.ts';

export const GET = handlePublic(async () => ({
  calculators: listCalculators().map(({ name, title, group, sentence }) => ({
    name,
    title,
    group,
    sentence,
    request: `/api/method/${name}`,
    page: `/method/${name}`,
  })),
}));
