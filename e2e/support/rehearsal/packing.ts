import type { components } from '../../../client/src/api/schema.js';
import { type Caller, bodyOf } from '../caller.js';

type Parcel = components['schemas']['ParcelDto'];

export async function openParcel(packer: Caller, order: string): Promise<Parcel> {
  return (await bodyOf(await packer.create('/api/parcels', { order }))) as Parcel;
}

/** Scans the unit, then a place of each thing that is still missing, as the list of the parcel names them. */
export async function packByScanning(packer: Caller, parcel: Parcel, serial: string): Promise<Parcel> {
  const scan = async (body: object): Promise<void> => {
    await bodyOf(await packer.post(`/api/parcels/${parcel.number}/scans`, body));
  };
  await scan({ code: serial });
  for (const { id, part, traced, places } of parcel.needs) {
    if (traced === 'single') continue;
    const [place] = places;
    if (!place) throw new Error(`${part} lies nowhere`);
    await scan({ code: traced === 'delivery' ? place.lot : part, bin: place.bin, needId: id });
  }
  return (await bodyOf(await packer.get(`/api/parcels/${parcel.number}`))) as Parcel;
}

/** Closes the parcel, weighs it, says how it travels, and hands it over. */
export async function ship(packer: Caller, { number, version }: Parcel): Promise<Parcel> {
  const path = `/api/parcels/${number}`;
  const packed = (await bodyOf(await packer.post(`${path}/packed`, { version }))) as Parcel;
  const weighed = (await bodyOf(
    await packer.put(`${path}/lithium`, {
      mode: 'road',
      weightG: 1400,
      wattHoursOnCase: true,
      chargePercent: null,
      version: packed.version,
    }),
  )) as Parcel;
  const way = { carrier: 'Island Post', trackingCode: 'IP 123 456', version: weighed.version };
  return (await bodyOf(await packer.post(`${path}/dispatch`, way))) as Parcel;
}
