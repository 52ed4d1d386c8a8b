package treadwork.io.result;

import treadwork.model.study.Normalisation;

/**
 * The units of loads under a normalisation, as column names carry them. Power has no meaning in per cent of body weight
 * × height, so with that normalisation it is divided by body mass.
 */
record LoadUnits(String moment, String force, String power) {

    static LoadUnits of(Normalisation by) {
        return switch (by) {
            case NONE -> new LoadUnits("Nm", "N", "W");
            case MASS -> new LoadUnits("Nm_per_kg", "N_per_kg", "W_per_kg");
            case MASS_HEIGHT -> new LoadUnits("Nm_per_kg_m", "N_per_kg_m", "W_per_kg_m");
            case WEIGHT_HEIGHT_PERCENT -> new LoadUnits("percent_BWHt", "percent_BW", "W_per_kg");
        };
    }
}
