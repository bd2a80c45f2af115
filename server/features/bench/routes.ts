import type { Router } from 'express';
import { bit, machine, stock } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { mount } from '#server/http/endpoint-router.ts';
import type { BitCreate, MachineCreate, StockCreate } from '#shared/api/bench.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import { presentBit, presentMachine, presentStock } from './present.ts';
import { shelf } from './shelf.ts';

export function benchRoutes(router: Router, deps: Deps): void {
  const machines = shelf<MachineCreate, ReturnType<typeof presentMachine>>(
    deps,
    machine,
    'machine',
    ['accelerationMmPerS2'],
    presentMachine,
  );
  mount(router, deps, endpoints.listMachines, ({ member }) => machines.list(member.id));
  mount(router, deps, endpoints.addMachine, ({ member, body, request }) =>
    machines.add(member.id, body, request.get('Idempotency-Key')),
  );
  mount(router, deps, endpoints.changeMachine, ({ member, body, param }) =>
    machines.change(member.id, param('id'), body),
  );
  mount(
    router,
    deps,
    endpoints.removeMachine,
    async ({ member, param }) => void (await machines.remove(member.id, param('id'))),
  );

  const bits = shelf<BitCreate, ReturnType<typeof presentBit>>(
    deps,
    bit,
    'bit',
    ['maxRpm', 'angleDeg'],
    presentBit,
  );
  mount(router, deps, endpoints.listBits, ({ member }) => bits.list(member.id));
  mount(router, deps, endpoints.addBit, ({ member, body, request }) =>
    bits.add(member.id, body, request.get('Idempotency-Key')),
  );
  mount(router, deps, endpoints.changeBit, ({ member, body, param }) =>
    bits.change(member.id, param('id'), body),
  );
  mount(
    router,
    deps,
    endpoints.removeBit,
    async ({ member, param }) => void (await bits.remove(member.id, param('id'))),
  );

  const stocks = shelf<StockCreate, ReturnType<typeof presentStock>>(deps, stock, 'stock', [], presentStock);
  mount(router, deps, endpoints.listStock, ({ member }) => stocks.list(member.id));
  mount(router, deps, endpoints.addStock, ({ member, body, request }) =>
    stocks.add(member.id, body, request.get('Idempotency-Key')),
  );
  mount(router, deps, endpoints.changeStock, ({ member, body, param }) =>
    stocks.change(member.id, param('id'), body),
  );
  mount(
    router,
    deps,
    endpoints.removeStock,
    async ({ member, param }) => void (await stocks.remove(member.id, param('id'))),
  );
}
