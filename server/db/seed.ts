import { readEnv } from '#server/env.ts';
import { isMainModule } from '#server/main-module.ts';
import { initModels } from '#server/models/index.ts';
import { connect } from './connect.ts';
import { seedClasses } from './seed-classes.ts';
import { seedDemo } from './seed-demo.ts';
import { seedMaterials } from './seed-materials.ts';
import { openSequelize } from './sequelize.ts';

/** `tsx server/db/seed.ts`: materials, limits of classes, and the demo where nobody has an account yet. */
async function main(): Promise<string> {
  const sequelize = openSequelize(readEnv().DATABASE_URL);
  try {
    await connect(sequelize);
    initModels(sequelize);
    const materials = await seedMaterials();
    const classes = await seedClasses();
    const demo = await seedDemo();
    return `Materials: ${materials.added} added, ${materials.renewed} renewed. Editions of classes: ${classes.added} added, ${classes.renewed} renewed. Demo: ${demo ? 'added' : 'left as it is'}.`;
  } finally {
    await sequelize.close();
  }
}

if (isMainModule(import.meta.url)) {
  try {
    console.log(await main());
  } catch (error) {
    console.error(error instanceof Error ? error.message : String(error));
    process.exitCode = 1;
  }
}
