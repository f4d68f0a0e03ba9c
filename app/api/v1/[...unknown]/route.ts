import { Refusal } from '@/src/errors';
import { problemResponse } from '@/src/web/problem';

const nowhere = (): Response =>
  problemResponse(new Refusal('notFound', 'There is no such address in this API: see /api/v1/openapi.json.'));

export { nowhere as DELETE, nowhere as GET, nowhere as PATCH, nowhere as POST, nowhere as PUT };
