import { api, withQuery } from '../../lib/api/client';
import type { Page, Role } from '../../lib/api/types';
import { useApi } from '../../lib/api/use-api';
import type {
  District,
  IngestKey,
  Measure,
  Neighbours,
  Office,
  Rule,
  Sensor,
  Source,
  Tower,
  TowerChange,
  Upload,
  User,
} from './types';

export const useUsers = () => useApi<Page<User>>(withQuery('/api/users', { pageSize: 200 }));
export const useTowers = () => useApi<Tower[]>('/api/towers');
export const useTower = (id: number) => useApi<Tower>(`/api/towers/${id}`);
export const useSources = (towerId: number) =>
  useApi<Source[]>(`/api/towers/${towerId}/sources`, { live: true });
/** The last text file that was uploaded for a tower and taken in; undefined while asked, and where there is none. */
export const useLastUpload = (towerId: number): Upload | undefined =>
  useApi<Upload[]>(withQuery('/api/uploads', { towerId })).data?.find(
    ({ state, kind }) => state === 'done' && kind === 'text',
  );
export const useKeys = (towerId: number) => useApi<IngestKey[]>(`/api/towers/${towerId}/keys`);
export const useDistrictSettings = () => useApi<District[]>('/api/districts');
export const useRules = (districtId: number | undefined) =>
  useApi<Rule[]>(districtId === undefined ? null : `/api/districts/${districtId}/rules`);
export const useMeasures = () => useApi<Measure[]>('/api/rules/measures');
export const useOffice = () => useApi<Office>('/api/office');

/** Whom to invite. */
export interface Invitation {
  email: string;
  name: string;
  role: Role;
  districtIds: number[];
}

export const invite = (invitation: Invitation) =>
  api.post<{ user: User; invitationUrl: string }>('/api/users', invitation);
export const changeUser = (id: number, change: { role: Role; districtIds: number[] }) =>
  api.patch<User>(`/api/users/${id}`, change);
export const retireUser = (id: number) => api.post<User>(`/api/users/${id}/retire`);
export const newPasswordLink = (id: number) => api.post<{ url: string }>(`/api/users/${id}/password-link`);

export const addTower = (tower: object) => api.post<Tower>('/api/towers', tower);
export const changeTower = (id: number, change: object) => api.patch<Tower>(`/api/towers/${id}`, change);
export const addSensor = (towerId: number, sensor: object) =>
  api.post<object>(`/api/towers/${towerId}/sensors`, sensor);
export const changeSensor = (id: number, change: object) => api.patch<Sensor>(`/api/sensors/${id}`, change);
export const retireSensor = (id: number, retired: boolean) => changeSensor(id, { retired });
export const removeSensor = (id: number) => api.remove<object>(`/api/sensors/${id}`);
export const removeVersion = (id: number, from: string | null) =>
  api.remove<Sensor>(`/api/sensors/${id}/versions/${encodeURIComponent(from ?? 'beginning')}`);
export const removeTower = (id: number) => api.remove<object>(`/api/towers/${id}`);
export const useTowerChanges = (towerId: number, page: number) =>
  useApi<Page<TowerChange>>(withQuery(`/api/towers/${towerId}/changes`, { page, pageSize: 10 }), {
    live: true,
    keepPrevious: true,
  });
export const useNeighbours = (towerId: number) => useApi<Neighbours>(`/api/towers/${towerId}/neighbours`);
export const setNeighbours = (towerId: number, neighbours: Neighbours) =>
  api.put<Neighbours>(`/api/towers/${towerId}/neighbours`, neighbours);
export const addSource = (towerId: number, source: object) =>
  api.post<Source>(`/api/towers/${towerId}/sources`, source);
export const changeSource = (id: number, change: object) => api.patch<Source>(`/api/sources/${id}`, change);
export const retireSource = (id: number) => api.post<Source>(`/api/sources/${id}/retire`);
export const collectSource = (id: number) => api.post<Source>(`/api/sources/${id}/collect`);
export const makeKey = (towerId: number, name: string) =>
  api.post<{ id: number; key: string }>(`/api/towers/${towerId}/keys`, { name });
export const revokeKey = (id: number) => api.remove<object>(`/api/keys/${id}`);

export const addDistrict = (district: object) => api.post<District>('/api/districts', district);
export const changeDistrict = (id: number, change: object) =>
  api.patch<District>(`/api/districts/${id}`, change);

export const draftRule = (districtId: number, draft: { body: unknown; note: string }) =>
  api.post<Rule>(`/api/districts/${districtId}/rules`, draft);
export const putInForce = (ruleId: number) => api.post<Rule>(`/api/rules/${ruleId}/put-in-force`);

export const setOffice = (office: Office) => api.put<Office>('/api/office', office);
