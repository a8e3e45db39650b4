import { useParams } from 'react-router-dom';

/** Id of the building in the address; pages below /buildings/:buildingId only. */
export function useBuildingId(): string {
  const { buildingId } = useParams();
  if (buildingId === undefined) throw new Error('useBuildingId is for pages of a building');
  return buildingId;
}
