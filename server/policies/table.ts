import type { ClubRole } from '#shared/schemas/club.ts';
import type { GliderRole } from '#shared/schemas/glider.ts';

/** What the asker is to a row of materials: to everybody's rows by site role, to a private one as its keeper. */
export type MaterialStanding = 'visitor' | 'user' | 'admin' | 'keeper';

/** What the asker is to an edition of a class: to everybody’s by site role, to a club’s own as one of its members. */
export type ClassEditionStanding = 'user' | 'admin' | ClubRole;

/** What the asker is to a stock piece. */
export type StockPieceStanding = 'keeper';

/**
 * Who may do what. Every service asks this table and nothing else; a test walks every role through every route.
 * Who has no role on a glider, or no standing to a material, is answered as if it did not exist.
 */
export const POLICY = {
  glider: {
    read: ['owner', 'builder', 'pilot', 'reader'],
    edit: ['owner', 'builder'],
    saveSheet: ['owner', 'builder', 'pilot'],
    delete: ['owner'],
    nameSave: ['owner', 'builder'],
    addPhoto: ['owner', 'builder', 'pilot'],
    captionPhoto: ['owner', 'builder', 'pilot'],
    deletePhoto: ['owner', 'builder'],
    archive: ['owner'],
    share: ['owner'],
    transfer: ['owner'],
    leave: ['builder', 'pilot', 'reader'],
    /** readings, corrections, target mass and the lead at hand */
    weigh: ['owner', 'builder', 'pilot'],
    signFlight: ['owner', 'builder', 'pilot'],
  },
  material: {
    read: ['visitor', 'user', 'admin', 'keeper'],
    readUses: ['user', 'admin', 'keeper'],
    edit: ['admin', 'keeper'],
    delete: ['admin', 'keeper'],
  },
  stockPiece: {
    read: ['keeper'],
    edit: ['keeper'],
    cut: ['keeper'],
    reserve: ['keeper'],
    delete: ['keeper'],
  },
  club: {
    read: ['secretary', 'director', 'member'],
    edit: ['secretary'],
    keepMembers: ['secretary'],
    keepClasses: ['secretary'],
    runContests: ['secretary', 'director'],
    shareGlider: ['secretary', 'director', 'member'],
    leave: ['secretary', 'director', 'member'],
  },
  classEdition: {
    read: ['user', 'admin', 'secretary', 'director', 'member'],
    edit: ['admin', 'secretary'],
  },
  site: {
    addClub: ['user', 'admin'],
    addClassEdition: ['admin'],
    addOwnMaterial: ['user', 'admin'],
    addSharedMaterial: ['admin'],
    addGlider: ['user', 'admin'],
    addStockPiece: ['user', 'admin'],
  },
} as const satisfies {
  glider: Record<string, readonly GliderRole[]>;
  material: Record<string, readonly MaterialStanding[]>;
  stockPiece: Record<string, readonly StockPieceStanding[]>;
  club: Record<string, readonly ClubRole[]>;
  classEdition: Record<string, readonly ClassEditionStanding[]>;
  site: Record<string, readonly ('user' | 'admin')[]>;
};

export type GliderAction = keyof typeof POLICY.glider;
export type MaterialAction = keyof typeof POLICY.material;
export type StockPieceAction = keyof typeof POLICY.stockPiece;
export type ClubAction = keyof typeof POLICY.club;
export type ClassEditionAction = keyof typeof POLICY.classEdition;
export type SiteAction = keyof typeof POLICY.site;
