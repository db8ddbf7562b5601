import { randomUUID } from 'node:crypto';
import { attemptStoreBehaviour } from '../../support/server-attempt-behaviour.ts';
import { hum } from '../../support/server-content.ts';
import { MemoryAttempts } from '../../support/server-memory-attempts.ts';

attemptStoreBehaviour(async () => {
  const tom = { id: randomUUID(), name: 'Tom' };
  const iris = { id: randomUUID(), name: 'Iris' };
  return {
    store: new MemoryAttempts({ [tom.id]: tom.name, [iris.id]: iris.name }),
    content: hum,
    scenario: randomUUID(),
    otherScenario: randomUUID(),
    versionId: randomUUID(),
    otherVersionId: randomUUID(),
    tom,
    iris,
    organisation: randomUUID(),
  };
});
