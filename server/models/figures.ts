import { DataTypes } from 'sequelize';

/** Columns of the headline figures, the same on a glider, a save and a sheet; made anew, for Sequelize keeps them. */
export const figureColumns = () => ({
  mass: { type: DataTypes.DOUBLE, allowNull: false, field: 'mass_g' },
  percentMac: { type: DataTypes.DOUBLE, allowNull: true, field: 'percent_mac' },
  wingLoading: { type: DataTypes.DOUBLE, allowNull: true, field: 'wing_loading_g_dm2' },
});
