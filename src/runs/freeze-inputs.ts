import type { EntityManager } from '@mikro-orm/postgresql';
import type { Catalogue } from '@/entities';
import type { FrozenMaterial, RunInputs, RunOptics } from '@/entities/run-inputs';
import { currentMaterials, type CurrentMaterial } from '@/src/materials/current-materials';
import { frozenMaterial, materialNamed } from '@/src/materials/resolve-material';
import { criticalBeta } from '@/src/physics/orbit';
import { resolveStar } from '@/src/stars/resolve-star';
import type { RunRequest } from './request-schema';

/** All that a run depends on, by value: later changes of presets do not reach it. */
export async function freezeInputs(
  em: EntityManager,
  groupId: string | null,
  catalogue: Catalogue,
  request: RunRequest,
): Promise<RunInputs> {
  const star = await resolveStar(em, groupId, request);
  const current = await currentMaterials(em, groupId);
  const optics = canonicalOptics(request.optics, current);
  const slugs = new Set([
    ...catalogue.materials.map(({ material }) => material),
    ...(optics.mantle ? [optics.mantle.material] : []),
  ]);
  return {
    catalogue: { id: catalogue.id, name: catalogue.name, sha256: catalogue.sha256, rows: catalogue.rowsAccepted },
    star,
    release: request.release,
    optics,
    ...(request.wind ? { wind: { ...request.wind, qsw: request.wind.qsw ?? 1 } } : {}),
    ...(request.disc ? { disc: request.disc } : {}),
    ...(request.charging ? { charging: request.charging } : {}),
    betaCritical: criticalBeta(request.release),
    materials: [...slugs].map((slug) => frozen(current, slug)),
  };
}

const frozen = (current: Map<string, CurrentMaterial>, slug: string): FrozenMaterial =>
  frozenMaterial(materialNamed(current, slug, '/catalogueId'));

function canonicalOptics(optics: RunRequest['optics'], current: Map<string, CurrentMaterial>): RunOptics {
  if (!optics.mantle) return optics;
  const mantle = materialNamed(current, optics.mantle.material, '/optics/mantle/material');
  return { ...optics, mantle: { ...optics.mantle, material: mantle.material.slug } };
}
