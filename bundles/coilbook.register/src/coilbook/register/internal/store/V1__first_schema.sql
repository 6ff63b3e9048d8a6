-- The first schema. One table a kind of row, one line a version: seq_from and seq_to are the journal sequences at which it became known and was
-- replaced; row_id stays while the row exists. A quantity stands in SI with its provenance beside it (1 measured, 2 nameplate, 3 catalogue,
-- 4 estimated by rule, 5 assumed).

create table coilbook_register (
    schema_version integer not null,
    register_id varchar(36) not null
);

create table journal (
    seq bigint not null primary key,
    who varchar(4000) not null,
    recorded_at timestamp(6) not null,
    why varchar(4000) not null,
    compensates bigint not null,
    row_count integer not null,
    previous_digest varchar(64) not null,
    digest varchar(64) not null
);

create table journal_kind (
    seq bigint not null,
    kind varchar(80) not null,
    first_version bigint not null,
    opened integer not null,
    closed integer not null,
    primary key (seq, kind)
);

create table customer (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    code varchar(4000) not null,
    name varchar(4000),
    note varchar(4000)
);
create index customer_lookup on customer (row_key);
create index customer_closed on customer (seq_to);

create table site (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    code varchar(4000) not null,
    customer varchar(4000),
    name varchar(4000),
    country varchar(4000) not null,
    time_zone varchar(4000),
    ambient_lowest double precision,
    ambient_lowest_prov smallint,
    ambient_nominal double precision,
    ambient_nominal_prov smallint,
    ambient_highest double precision,
    ambient_highest_prov smallint,
    note varchar(4000)
);
create index site_lookup on site (row_key);
create index site_closed on site (seq_to);

create table transformer_type (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    code varchar(4000) not null,
    maker varchar(4000),
    status varchar(80),
    primary_voltage double precision,
    primary_voltage_prov smallint,
    secondary_voltage double precision,
    secondary_voltage_prov smallint,
    rating double precision,
    rating_prov smallint,
    regulation double precision,
    regulation_prov smallint,
    lowest_frequency double precision,
    lowest_frequency_prov smallint,
    safety_isolating boolean,
    price numeric(30, 10),
    labour double precision,
    labour_prov smallint,
    stock integer,
    source varchar(4000)
);
create index transformer_type_lookup on transformer_type (row_key);
create index transformer_type_closed on transformer_type (seq_to);

create table circuit (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    site varchar(4000) not null,
    code varchar(4000) not null,
    system varchar(80),
    connection varchar(80),
    nominal_voltage double precision,
    nominal_voltage_prov smallint,
    nominal_frequency double precision,
    nominal_frequency_prov smallint,
    tolerance_below double precision,
    tolerance_below_prov smallint,
    tolerance_above double precision,
    tolerance_above_prov smallint,
    protective_device varchar(4000),
    protective_rating double precision,
    protective_rating_prov smallint,
    inrush_withstand double precision,
    inrush_withstand_prov smallint,
    other_load double precision,
    other_load_prov smallint,
    nec_rules boolean,
    transformer_type varchar(4000),
    transformer_use varchar(80),
    note varchar(4000)
);
create index circuit_lookup on circuit (row_key);
create index circuit_closed on circuit (seq_to);

create table line (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    site varchar(4000) not null,
    code varchar(4000) not null,
    machine varchar(4000),
    speed double precision,
    speed_prov smallint,
    note varchar(4000)
);
create index line_lookup on line (row_key);
create index line_closed on line (seq_to);

create table valve_type (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    code varchar(4000) not null,
    maker varchar(4000),
    status varchar(80),
    family varchar(4000),
    opening_delay double precision,
    opening_delay_prov smallint,
    closing_delay double precision,
    closing_delay_prov smallint,
    highest_rate double precision,
    highest_rate_prov smallint,
    highest_fluid_temperature double precision,
    highest_fluid_temperature_prov smallint,
    highest_fluid_pressure double precision,
    highest_fluid_pressure_prov smallint,
    coil_families varchar(4000),
    expected_life_cycles double precision,
    expected_life_cycles_prov smallint,
    price numeric(30, 10),
    labour double precision,
    labour_prov smallint,
    stock integer,
    source varchar(4000)
);
create index valve_type_lookup on valve_type (row_key);
create index valve_type_closed on valve_type (seq_to);

create table coil_type (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    code varchar(4000) not null,
    maker varchar(4000),
    status varchar(80),
    family varchar(4000),
    rated_kind varchar(80),
    rated_voltage double precision,
    rated_voltage_prov smallint,
    rated_frequency double precision,
    rated_frequency_prov smallint,
    resistance20 double precision,
    resistance20_prov smallint,
    resistance_tolerance double precision,
    resistance_tolerance_prov smallint,
    inductance double precision,
    inductance_prov smallint,
    inductance_closed double precision,
    inductance_closed_prov smallint,
    pull_in_current double precision,
    pull_in_current_prov smallint,
    pull_in_pressure double precision,
    pull_in_pressure_prov smallint,
    drop_out_current double precision,
    drop_out_current_prov smallint,
    ride_through double precision,
    ride_through_prov smallint,
    highest_dissipation double precision,
    highest_dissipation_prov smallint,
    dissipation_ambient double precision,
    dissipation_ambient_prov smallint,
    thermal_resistance double precision,
    thermal_resistance_prov smallint,
    thermal_time_constant double precision,
    thermal_time_constant_prov smallint,
    insulation_class varchar(80),
    insulation_voltage double precision,
    insulation_voltage_prov smallint,
    insulation_peak_voltage double precision,
    insulation_peak_voltage_prov smallint,
    connector varchar(4000),
    pinout varchar(4000),
    approved_drivers varchar(4000),
    expected_life_cycles double precision,
    expected_life_cycles_prov smallint,
    price numeric(30, 10),
    labour double precision,
    labour_prov smallint,
    stock integer,
    source varchar(4000)
);
create index coil_type_lookup on coil_type (row_key);
create index coil_type_closed on coil_type (seq_to);

create table driver_type (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    code varchar(4000) not null,
    maker varchar(4000),
    status varchar(80),
    kind varchar(80),
    series_resistance double precision,
    series_resistance_prov smallint,
    series_resistance_tolerance double precision,
    series_resistance_tolerance_prov smallint,
    series_resistor_rating double precision,
    series_resistor_rating_prov smallint,
    capacitance double precision,
    capacitance_prov smallint,
    capacitance_tolerance double precision,
    capacitance_tolerance_prov smallint,
    rectifier_drop double precision,
    rectifier_drop_prov smallint,
    switch_drop double precision,
    switch_drop_prov smallint,
    clamp_voltage double precision,
    clamp_voltage_prov smallint,
    capacitor_rating double precision,
    capacitor_rating_prov smallint,
    switch_rating double precision,
    switch_rating_prov smallint,
    bleed_resistance double precision,
    bleed_resistance_prov smallint,
    pull_in_voltage double precision,
    pull_in_voltage_prov smallint,
    pull_in_time double precision,
    pull_in_time_prov smallint,
    hold_voltage double precision,
    hold_voltage_prov smallint,
    level_change varchar(80),
    bus_voltage double precision,
    bus_voltage_prov smallint,
    peak_current double precision,
    peak_current_prov smallint,
    peak_time double precision,
    peak_time_prov smallint,
    hold_current double precision,
    hold_current_prov smallint,
    output_voltage double precision,
    output_voltage_prov smallint,
    rectification varchar(80),
    efficiency double precision,
    efficiency_prov smallint,
    power_factor double precision,
    power_factor_prov smallint,
    standby_power double precision,
    standby_power_prov smallint,
    channels integer,
    coil_kind varchar(80),
    coil_voltage_from double precision,
    coil_voltage_from_prov smallint,
    coil_voltage_to double precision,
    coil_voltage_to_prov smallint,
    coils_per_channel integer,
    coil_connections varchar(4000),
    lowest_load double precision,
    lowest_load_prov smallint,
    output_current_limit double precision,
    output_current_limit_prov smallint,
    module_current_limit double precision,
    module_current_limit_prov smallint,
    isolated_from_mains boolean,
    output_earthed boolean,
    control_isolated boolean,
    control_on_voltage double precision,
    control_on_voltage_prov smallint,
    control_off_voltage double precision,
    control_off_voltage_prov smallint,
    control_current double precision,
    control_current_prov smallint,
    control_leakage double precision,
    control_leakage_prov smallint,
    control_polarity varchar(80),
    shortest_control_pulse double precision,
    shortest_control_pulse_prov smallint,
    marks varchar(4000),
    inrush double precision,
    inrush_prov smallint,
    short_circuit varchar(80),
    timer_supply_voltage double precision,
    timer_supply_voltage_prov smallint,
    timer_supply_current double precision,
    timer_supply_current_prov smallint,
    expected_life double precision,
    expected_life_prov smallint,
    price numeric(30, 10),
    labour double precision,
    labour_prov smallint,
    stock integer,
    source varchar(4000)
);
create index driver_type_lookup on driver_type (row_key);
create index driver_type_closed on driver_type (seq_to);

create table input_setting (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    driver_type varchar(4000) not null,
    code varchar(4000) not null,
    description varchar(4000),
    nominal_voltage double precision,
    nominal_voltage_prov smallint,
    lowest_voltage double precision,
    lowest_voltage_prov smallint,
    highest_voltage double precision,
    highest_voltage_prov smallint,
    lowest_frequency double precision,
    lowest_frequency_prov smallint,
    highest_frequency double precision,
    highest_frequency_prov smallint,
    transformer_fed boolean,
    as_delivered boolean
);
create index input_setting_lookup on input_setting (row_key);
create index input_setting_closed on input_setting (seq_to);

create table cable_type (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    code varchar(4000) not null,
    maker varchar(4000),
    status varchar(80),
    cross_section double precision,
    cross_section_prov smallint,
    conductor_resistance double precision,
    conductor_resistance_prov smallint,
    rated_voltage double precision,
    rated_voltage_prov smallint,
    temperature_rating double precision,
    temperature_rating_prov smallint,
    price numeric(30, 10),
    labour double precision,
    labour_prov smallint,
    source varchar(4000)
);
create index cable_type_lookup on cable_type (row_key);
create index cable_type_closed on cable_type (seq_to);

create table controller (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    site varchar(4000) not null,
    code varchar(4000) not null,
    output_type varchar(4000),
    polarity varchar(80),
    on_voltage double precision,
    on_voltage_prov smallint,
    off_voltage double precision,
    off_voltage_prov smallint,
    leakage double precision,
    leakage_prov smallint,
    output_current double precision,
    output_current_prov smallint,
    shortest_pulse double precision,
    shortest_pulse_prov smallint,
    isolated boolean,
    common_bonded boolean,
    fed_from_driver boolean,
    supply_voltage double precision,
    supply_voltage_prov smallint,
    supply_current double precision,
    supply_current_prov smallint,
    note varchar(4000)
);
create index controller_lookup on controller (row_key);
create index controller_closed on controller (seq_to);

create table station (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    site varchar(4000) not null,
    line varchar(4000) not null,
    tag varchar(4000) not null,
    description varchar(4000),
    position integer,
    controller varchar(4000),
    channel integer,
    coils_on_channel integer,
    coil_connection varchar(80),
    cable_length double precision,
    cable_length_prov smallint,
    cable_temperature double precision,
    cable_temperature_prov smallint,
    coil_ambient_lowest double precision,
    coil_ambient_lowest_prov smallint,
    coil_ambient_nominal double precision,
    coil_ambient_nominal_prov smallint,
    coil_ambient_highest double precision,
    coil_ambient_highest_prov smallint,
    body_temperature double precision,
    body_temperature_prov smallint,
    conductance_to_air double precision,
    conductance_to_air_prov smallint,
    conductance_to_body double precision,
    conductance_to_body_prov smallint,
    fluid_temperature double precision,
    fluid_temperature_prov smallint,
    fluid_pressure double precision,
    fluid_pressure_prov smallint,
    stuck_on_guard boolean,
    discharge_warning double precision,
    discharge_warning_prov smallint,
    extra_low_voltage boolean,
    last_inspection date,
    note varchar(4000)
);
create index station_lookup on station (row_key);
create index station_closed on station (seq_to);

create table supply (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    station varchar(4000) not null,
    valid_from date,
    valid_to date,
    circuit varchar(4000) not null
);
create index supply_lookup on supply (station);
create index supply_closed on supply (seq_to);

create table setting_choice (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    station varchar(4000) not null,
    valid_from date,
    valid_to date,
    setting varchar(4000) not null,
    provenance varchar(80)
);
create index setting_choice_lookup on setting_choice (station);
create index setting_choice_closed on setting_choice (seq_to);

create table duty (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    station varchar(4000) not null,
    valid_from date,
    valid_to date,
    cycle_rate double precision,
    cycle_rate_prov smallint,
    on_time double precision,
    on_time_prov smallint,
    burst_rate double precision,
    burst_rate_prov smallint,
    speed double precision,
    speed_prov smallint,
    bead_length double precision,
    bead_length_prov smallint,
    gap double precision,
    gap_prov smallint,
    pitch double precision,
    pitch_prov smallint,
    hours_per_year double precision,
    hours_per_year_prov smallint
);
create index duty_lookup on duty (station);
create index duty_closed on duty (seq_to);

create table item (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    kind varchar(80) not null,
    serial varchar(4000) not null,
    type varchar(4000) not null,
    status varchar(80),
    note varchar(4000)
);
create index item_lookup on item (row_key);
create index item_closed on item (seq_to);

create table fitting (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    station varchar(4000) not null,
    kind varchar(80) not null,
    valid_from date,
    valid_to date,
    type varchar(4000) not null,
    serial varchar(4000),
    why_it_came varchar(4000),
    why_it_left varchar(4000),
    failure_mode varchar(4000),
    failure_mechanism varchar(4000),
    detection_method varchar(4000),
    counter_at_fitting double precision,
    counter_at_fitting_prov smallint,
    counter_at_removal double precision,
    counter_at_removal_prov smallint,
    by varchar(4000),
    note varchar(4000)
);
create index fitting_lookup on fitting (station);
create index fitting_closed on fitting (seq_to);
create index fitting_serial on fitting (serial);

create table reading (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    subject_kind varchar(80) not null,
    subject varchar(4000) not null,
    quantity varchar(80) not null,
    taken_at timestamp(6) not null,
    value_ double precision not null,
    temperature double precision,
    temperature_prov smallint,
    uncertainty double precision,
    uncertainty_prov smallint,
    instrument varchar(4000),
    calibrated_on date,
    by varchar(4000),
    conditions varchar(4000),
    note varchar(4000)
);
create index reading_lookup on reading (subject);
create index reading_closed on reading (seq_to);

create table concession (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    station varchar(4000) not null,
    criterion varchar(4000) not null,
    valid_from date,
    valid_to date not null,
    reason varchar(4000) not null,
    granted_by varchar(4000) not null,
    second_approver varchar(4000),
    value_when_granted double precision
);
create index concession_lookup on concession (station);
create index concession_closed on concession (seq_to);

create table market_mains (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    country varchar(4000) not null,
    name varchar(4000),
    voltages varchar(4000),
    frequencies varchar(4000),
    three_phase varchar(4000),
    ask_the_site boolean,
    remark varchar(4000),
    source varchar(4000)
);
create index market_mains_lookup on market_mains (row_key);
create index market_mains_closed on market_mains (seq_to);

create table market_tolerance (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    country varchar(4000) not null,
    nominal_from double precision not null,
    nominal_from_prov smallint,
    nominal_to double precision not null,
    nominal_to_prov smallint,
    lowest double precision not null,
    lowest_prov smallint,
    highest double precision not null,
    highest_prov smallint,
    standard varchar(4000),
    source varchar(4000)
);
create index market_tolerance_lookup on market_tolerance (row_key);
create index market_tolerance_closed on market_tolerance (seq_to);

create table market_mark (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    country varchar(4000) not null,
    mark varchar(4000) not null,
    alternatives varchar(4000),
    applies varchar(4000),
    remark varchar(4000),
    source varchar(4000)
);
create index market_mark_lookup on market_mark (row_key);
create index market_mark_closed on market_mark (seq_to);

create table fleet_setting (
    version_id bigint not null primary key,
    row_id bigint not null,
    row_key varchar(8000) not null,
    seq_from bigint not null,
    seq_to bigint,
    name varchar(4000) not null,
    value_ double precision not null,
    why varchar(4000)
);
create index fleet_setting_lookup on fleet_setting (row_key);
create index fleet_setting_closed on fleet_setting (seq_to);
