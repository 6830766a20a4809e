/**
 * Which gates are not weather or insects, and why: echo that stays, radial streaks, speckle, blocked sectors, the
 * height ceiling; deep convection is marked as context.
 *
 * <p>May use: sweep and its base.
 * Open {@link hemline.screening.Screening} first.
 *
 * <p>Follows Steiner and Smith (2002), J. Atmos. Oceanic Technol. 19:673, and Hubbert, Dixon and Ellis (2009),
 * J. Atmos. Oceanic Technol. 26:1714, for texture.
 */
package hemline.screening;
