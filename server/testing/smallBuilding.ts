import type { Agent } from './startTestServer.ts';

/** Two stories, two walls each way, one wind case; invented. */
export const smallBuilding = {
  settings: { name: 'Two stories', units: 'us', accidental: 0 },
  levels: 'level,height,x,y,extent_x,extent_y\nRoof,11,30,20,60,40\nL2,13,30,20,60,40\n',
  walls:
    'wall,x1,y1,x2,y2,thickness,from_level,to_level\n' +
    'A,0,10,0,30,10,L2,Roof\nB,60,10,60,30,10,L2,Roof\nC,20,0,40,0,10,L2,Roof\nD,20,40,40,40,10,L2,Roof\n',
  forces: 'level,case,kind,fx,fy\nRoof,WX,wind,24,0\nL2,WX,wind,26,0\nRoof,WY,wind,0,30\nL2,WY,wind,0,34\n',
  gravity:
    'level,wall,dead,live\n' + ['A', 'B', 'C', 'D'].map((wall) => `Roof,${wall},40,12\nL2,${wall},55,30\n`).join(''),
} as const;

export type SmallTable = Exclude<keyof typeof smallBuilding, 'settings'>;

export async function newBuilding(agent: Agent, settings: object = smallBuilding.settings): Promise<string> {
  const answer = await agent.post('/api/buildings').send(settings).expect(201);
  return (answer.body as { id: string }).id;
}

export function upload(agent: Agent, id: string, table: string, text: string, fields: Record<string, string> = {}) {
  const sent = agent.post(`/api/buildings/${id}/uploads`).field('table', table);
  for (const [name, value] of Object.entries(fields)) void sent.field(name, value);
  return sent.attach('file', Buffer.from(text), `${table}.csv`);
}

/** A building with all four tables taken. */
export async function newSmallBuilding(agent: Agent, settings: object = smallBuilding.settings): Promise<string> {
  const id = await newBuilding(agent, settings);
  for (const table of ['levels', 'walls', 'forces', 'gravity'] as const) {
    await upload(agent, id, table, smallBuilding[table]).expect(200);
  }
  return id;
}
