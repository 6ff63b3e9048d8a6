package coilbook.charts;

/** Light for sheets and bright rooms, dark for dark windows. Both tell lines apart by dashes too, never by colour alone. */
public enum ChartTheme {
    LIGHT, DARK
}
