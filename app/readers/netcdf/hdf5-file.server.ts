import { giveBackThread, takeThread } from "./hdf5-thread.server";
import type { Hdf5Reply, Hdf5Request } from "./hdf5-messages";
import { checkBlock, DamagedNetcdf, sizeOf, wholeOf, type NetcdfFile } from "./netcdf-file";

/**
 * Opens a NetCDF-4 (HDF5) file in a thread of its own and waits for each answer, so that reading stays a plain function.
 * @throws DamagedNetcdf where the library cannot read it, gives up, or takes too long
 */
export function openHdf5(bytes: Uint8Array): NetcdfFile {
  const thread = takeThread();
  let failed = false;
  const ask = <Kind extends Hdf5Reply["reply"]>(
    request: Hdf5Request,
    kind: Kind,
  ): Extract<Hdf5Reply, { reply: Kind }> => {
    const answer = failed ? null : thread.ask(request);
    if (answer !== null && isOf(answer, kind)) return answer;
    if (!failed) thread.stop();
    failed = true;
    throw answer === null
      ? new DamagedNetcdf("could not be read in time: it is damaged, or very large")
      : new DamagedNetcdf("is damaged, or no NetCDF-4 file: what it holds does not fit together");
  };
  const { variables, attributes } = ask({ ask: "open", bytes }, "opened");
  return {
    label: "NetCDF-4",
    variables,
    attributes,
    numbers: (variable, block = wholeOf(variable)) => {
      checkBlock(variable, block);
      const size = sizeOf(block.map(({ count }) => count));
      if (size === 0) return new Float64Array();
      const { values } = ask({ ask: "numbers", name: variable.name, block }, "numbers");
      if (values.length !== size) throw new DamagedNetcdf(`lacks values of its variable “${variable.name}”`);
      return values;
    },
    texts: (variable) => {
      checkBlock(variable, wholeOf(variable));
      return ask({ ask: "texts", name: variable.name }, "texts").texts;
    },
    close: () => {
      if (!failed) giveBackThread(thread);
      failed = true;
    },
  };
}

function isOf<Kind extends Hdf5Reply["reply"]>(
  answer: Hdf5Reply,
  kind: Kind,
): answer is Extract<Hdf5Reply, { reply: Kind }> {
  return answer.reply === kind;
}
