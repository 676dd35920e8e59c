package nappe.method;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import nappe.source.TextFault;
import org.junit.jupiter.api.Test;

/** Every fault of a method sheet, with line, column and mark; all at once, and none that only follows from another. */
class MethodFaultsTest {
    @Test
    void aSheetStartsWithItsTitle() {
        Texts texts = new Texts().method("pretend", """
                        line x = 1 ; 1 ; label""");
        assertThat(faults(texts)).isEqualTo("""
                pretend.txt:1:1: the first statement is "method" with a title (fault: title-missing)
                   \s
                    ^""");
    }

    @Test
    void aWordThatIsNoStatementIsAFaultAndNothingFollowsFromIt() {
        Texts texts = new Texts().method("pretend", """
                        method Pretend
                        lien x = 1 ; 1 ; label
                        line y = x ; 1 ; label""");
        assertThat(faults(texts)).isEqualTo("""
                pretend.txt:2:1: "lien" is not a statement word (fault: statement-unknown)
                    lien x = 1 ; 1 ; label
                    ^""");
    }

    @Test
    void faultsOfALine() {
        Texts texts = new Texts().method("pretend", """
                        method Pretend
                          and on
                        line
                        line x
                        line x = 1
                        line x2 = 1 ; furlong ; l
                        line x3 = a + ; m ; l
                        line x4 = y ; m ; l
                        line x5 = 1 m ; 1 ; l
                        line x6 = "a" ; 1 ; l
                        line x7 = 1 ; words ; l
                        line x8 = 1 m + 1 s ; m ; l
                        line x9 = § ; m ; l
                        line x9b = x9 + x8 + x7 + x6 + x5 + x4 + x3 + x2 + x ; m ; l
                        line z = 1 ; 1 ; l ; WMM ch. 8
                        line z2 = 1 ; 1 ; l
                        line z2 = 2 ; 1 ; l""");
        assertThat(faults(texts)).isEqualTo("""
                pretend.txt:3:4: found the end where a symbol was expected (fault: syntax)
                    line
                       ^
                pretend.txt:4:6: found the end where "=" was expected (fault: syntax)
                    line x
                         ^
                pretend.txt:5:10: no unit is given; write 1 for a pure number (fault: unit-unknown)
                    line x = 1
                             ^
                pretend.txt:6:15: "furlong" is not a known unit (fault: unit-unknown)
                    line x2 = 1 ; furlong ; l
                                  ^
                pretend.txt:7:14: found the end where a number, a symbol or "(" was expected (fault: syntax)
                    line x3 = a + ; m ; l
                                 ^
                pretend.txt:8:11: y is not defined above (fault: symbol-unknown)
                    line x4 = y ; m ; l
                              ^
                pretend.txt:9:6: the formula comes out as length, but 1 is a pure number (fault: unlike-dimensions)
                    line x5 = 1 m ; 1 ; l
                         ^
                pretend.txt:10:6: the formula gives words or a condition; write "words" for the unit (fault: unlike-dimensions)
                    line x6 = "a" ; 1 ; l
                         ^
                pretend.txt:11:6: the unit says words, but the formula gives none (fault: unlike-dimensions)
                    line x7 = 1 ; words ; l
                         ^
                pretend.txt:12:11: length plus time; both sides must be alike (fault: unlike-dimensions)
                    line x8 = 1 m + 1 s ; m ; l
                              ^
                pretend.txt:13:11: "§" has no meaning in a formula (fault: sign-unknown)
                    line x9 = § ; m ; l
                              ^
                pretend.txt:15:22: WMM is not a source of this sheet (fault: source-unknown)
                    line z = 1 ; 1 ; l ; WMM ch. 8
                                         ^
                pretend.txt:17:6: z2 is defined already (fault: symbol-twice)
                    line z2 = 2 ; 1 ; l
                         ^""");
    }

    @Test
    void faultsOfASourceOrAMark() {
        Texts texts = new Texts().method("pretend", """
                        method Pretend
                        source
                        source A
                        source B ; A book ; memori
                        source C ; A book ; memory
                        line x = 1 ; 1 ; l ; A p. 1
                        line y = 1 ; 1 ; l ; B p. 1
                        line w = 1 ; 1 ; l ; C p. 1 ; memori""");
        assertThat(faults(texts)).isEqualTo("""
                pretend.txt:2:1: a source has a key and a publication: source KEY ; publication (fault: source-unclear)
                    source
                    ^
                pretend.txt:3:1: a source has a key and a publication: source KEY ; publication (fault: source-unclear)
                    source A
                    ^
                pretend.txt:4:21: the only mark known here is "memory" (fault: mark-unknown)
                    source B ; A book ; memori
                                        ^
                pretend.txt:8:31: the only mark known here is "memory" (fault: mark-unknown)
                    line w = 1 ; 1 ; l ; C p. 1 ; memori
                                                  ^""");
    }

    @Test
    void faultsOfWhatIsGiven() {
        Texts texts = new Texts().method("pretend", """
                        method Pretend
                        entry
                        entry b
                        entry c ; m ; l ; positive
                        entry d ; m ; l ; any sign, optional
                        entry e = flow ; m3/s ; l
                        case e2 = flaw ; m3/s ; l
                        take f ; m ; l
                        case 2 ; m
                        choice k
                        choice k from no-such-table ; l
                        choice k2 from pretend-curve ; l
                        choice k3 from pretend-sizes ; l
                        table no-such-table by k ; A
                        table pretend-sizes by k9 ; A
                        column C ; 1 ; l
                        table pretend-sizes by b
                        table pretend-sizes with b
                        table pretend-curve between k3
                        table pretend-sizes between d
                        table pretend-curve by k3
                        table pretend-curve between d
                        table pretend-falling between b1
                        table pretend-broken between b1""");
        assertThat(faults(texts)).isEqualTo("""
                pretend.txt:2:5: found the end where a symbol was expected (fault: syntax)
                    entry
                        ^
                pretend.txt:3:7: no unit is given; write 1 for a pure number (fault: unit-unknown)
                    entry b
                          ^
                pretend.txt:4:19: "positive": only any sign, not negative and optional are known here (fault: rule-unknown)
                    entry c ; m ; l ; positive
                                      ^
                pretend.txt:6:7: an entry has no role; it is typed (fault: role-unknown)
                    entry e = flow ; m3/s ; l
                          ^
                pretend.txt:7:6: "flaw" is no role; roles are flow, flow through one, units in service, water level, energy level, rapid depth, head at the gauge, state of flow, measurement, reason, standing of the level, remark, scale of levels, control width (fault: role-unknown)
                    case e2 = flaw ; m3/s ; l
                         ^
                pretend.txt:8:6: what is taken has a role: take z_t = water level (fault: role-missing)
                    take f ; m ; l
                         ^
                pretend.txt:9:6: found "2" where a symbol was expected (fault: syntax)
                    case 2 ; m
                         ^
                pretend.txt:10:8: write: choice symbol from table ; label (fault: choice-unclear)
                    choice k
                           ^
                pretend.txt:11:8: there is no table tables/no-such-table.csv (fault: table-missing)
                    choice k from no-such-table ; l
                           ^
                pretend.txt:12:8: the first column of pretend-curve does not hold words (fault: choice-unclear)
                    choice k2 from pretend-curve ; l
                           ^
                pretend.txt:15:7: k9 is not defined above (fault: symbol-unknown)
                    table pretend-sizes by k9 ; A
                          ^
                pretend.txt:18:7: write: table name by choice, or: table name between number (fault: table-unclear)
                    table pretend-sizes with b
                          ^
                pretend.txt:19:7: k3 is not a pure number, as the first column of pretend-curve is (fault: unlike-dimensions)
                    table pretend-curve between k3
                          ^
                pretend.txt:20:7: the first column of pretend-sizes holds words: write "by" (fault: table-unclear)
                    table pretend-sizes between d
                          ^
                pretend.txt:21:7: the first column of pretend-curve holds numbers: write "between" (fault: table-unclear)
                    table pretend-curve by k3
                          ^
                pretend.txt:22:7: d is not a pure number, as the first column of pretend-curve is (fault: unlike-dimensions)
                    table pretend-curve between d
                          ^
                pretend.txt:23:7: b1 is not defined above (fault: symbol-unknown)
                    table pretend-falling between b1
                          ^
                pretend-broken.csv:4:5: "x" is not a number; write it like 2.5 or -1e-3, without a unit (fault: number-expected)
                    0.4,x
                        ^""");
    }

    @Test
    void faultsOfAColumn() {
        Texts texts = new Texts().method("pretend", """
                        method Pretend
                        source A ; book
                        entry r ; 1 ; l
                        column c ; 1 ; l
                        table pretend-falling between r ; A
                        column c ; 1 ; l
                        table pretend-broken between r ; A
                        table pretend-curve between r ; A
                        column q ; 1 ; l
                        column c ; m ; l
                        column e ; words ; l
                        column c2 = c ; 1 ; l
                        column e2 = e ; m ; l
                        line x = c + e + q ; 1 ; l""");
        assertThat(faults(texts)).isEqualTo("""
                pretend.txt:4:8: a column follows the table it is of (fault: table-missing)
                    column c ; 1 ; l
                           ^
                pretend.txt:5:7: the first column of pretend-falling must rise from row to row, without blanks (fault: table-not-rising)
                    table pretend-falling between r ; A
                          ^
                pretend-broken.csv:4:5: "x" is not a number; write it like 2.5 or -1e-3, without a unit (fault: number-expected)
                    0.4,x
                        ^
                pretend.txt:9:8: pretend-curve.csv has no column q; it has r, c, e (fault: column-unknown)
                    column q ; 1 ; l
                           ^
                pretend.txt:10:8: column c is a pure number, but m is length (fault: unlike-dimensions)
                    column c ; m ; l
                           ^
                pretend.txt:11:8: column e holds numbers (fault: unlike-dimensions)
                    column e ; words ; l
                           ^""");
    }

    @Test
    void faultsOfAConstant() {
        Texts texts = new Texts().method("pretend", """
                        method Pretend
                        source A ; book
                        constant a = 1 ; 1 ; l
                        constant b = 1 + 1 ; 1 ; l ; A
                        constant c = 2 m ; s ; l ; A
                        constant d = 2 ; s ; l ; A
                        constant e = 2 m ; m ; l ; X
                        constant f = -2 m ; m ; l ; A""");
        assertThat(faults(texts)).isEqualTo("""
                pretend.txt:3:10: a constant names its source (fault: source-missing)
                    constant a = 1 ; 1 ; l
                             ^
                pretend.txt:4:10: a constant is one number, with its unit (fault: constant-unclear)
                    constant b = 1 + 1 ; 1 ; l ; A
                             ^
                pretend.txt:5:10: the formula comes out as length, but s is time (fault: unlike-dimensions)
                    constant c = 2 m ; s ; l ; A
                             ^
                pretend.txt:6:10: the formula comes out as a pure number, but s is time (fault: unlike-dimensions)
                    constant d = 2 ; s ; l ; A
                             ^
                pretend.txt:7:28: X is not a source of this sheet (fault: source-unknown)
                    constant e = 2 m ; m ; l ; X
                                               ^
                pretend.txt:8:10: a constant is one number, with its unit (fault: constant-unclear)
                    constant f = -2 m ; m ; l ; A
                             ^""");
    }

    @Test
    void faultsOfRootsAtsLimitsRatingsAndGives() {
        Texts texts = new Texts().method("pretend", """
                        method Pretend
                        source A ; book
                        entry b ; m ; l
                        case Q = flow ; m3/s ; l
                        free h ; m ; l
                        free k ; m ; l
                        line q = b*h*1 m/s ; m3/s ; l
                        root x1 = h where q = b between 1 mm and 2 m ; m ; l
                        root x2 = h where q = Q between 1 s and 2 m ; m ; l
                        root x3 = h where q = Q between 1 m and 2 ; m ; l
                        root x4 = h where q = Q between 1 m and 2 m below 0 ; m ; l
                        root x5 = h where q = Q between 1 m and 2 m above 3 s ; m ; l
                        root x6 = h where q = Q between 1 m and 2 m trials 2 ; m ; l
                        root x7 = b where q = Q between 1 m and 2 m ; m ; l
                        root x8 = y where q = Q between 1 m and 2 m ; m ; l
                        root x9 = h where q = Q between h and 2 m ; m ; l
                        root x10 = h where q = Q between 1 m3/s and 2 m3/s ; m3/s ; l
                        root x11 = h where q = Q between 1 m and 2 m below y ; m ; l
                        root x12 = h where q = Q between 1 m ; m ; l
                        root x13 = h with q = Q ; m ; l
                        at h = 1 s : r = q
                        at h = 2*h : r2 = q
                        at b = 2 m : r3 = q
                        at h = 2 m : r4 = y
                        at h = 2 m
                        at h = y : r5 = q
                        line s = x1 + x2 + r + r2 + r3 + r5 ; m ; l
                        limit b <= 2 ; l ; A
                        limit b ; l ; A
                        limit b <= b <= b <= b ; l ; A
                        limit q <= Q ; l ; A
                        limit h <= b ; l ; A
                        limit b <= 2 m when b ; l ; A
                        limit b <= 2 m when h < 1 m ; l ; A
                        limit b <= 2 m scale 2 s ; l ; A
                        limit b <= 2 m scale h ; l ; A
                        limit b <= 2 m ; l
                        limit b <= 2 m ; l ; X
                        limit b < 2 m ; l ; A
                        limit b <= y ; l ; A
                        rating h from 1 s to 2 m steps 3 : q
                        rating h from 1 m to 2 m steps 0 : q
                        rating h from 1 m to k steps 3 : q
                        rating h from 1 m to 2 m : q
                        rating h from 1 m to 2 m steps 3 : y
                        give water level
                        give water level = y
                        give water level = q
                        give water table = b
                        give water level = b""");
        assertThat(faults(texts)).isEqualTo("""
                pretend.txt:8:6: the two sides differ: length^3 time^-1 and length (fault: unlike-dimensions)
                    root x1 = h where q = b between 1 mm and 2 m ; m ; l
                         ^
                pretend.txt:9:6: the formula comes out as time, but m is length (fault: unlike-dimensions)
                    root x2 = h where q = Q between 1 s and 2 m ; m ; l
                         ^
                pretend.txt:10:6: the formula comes out as a pure number, but m is length (fault: unlike-dimensions)
                    root x3 = h where q = Q between 1 m and 2 ; m ; l
                         ^
                pretend.txt:11:6: the formula comes out as a pure number, but m is length (fault: unlike-dimensions)
                    root x4 = h where q = Q between 1 m and 2 m below 0 ; m ; l
                         ^
                pretend.txt:12:6: the formula comes out as time, but m is length (fault: unlike-dimensions)
                    root x5 = h where q = Q between 1 m and 2 m above 3 s ; m ; l
                         ^
                pretend.txt:13:6: a root takes 3 trials or more (fault: trials-few)
                    root x6 = h where q = Q between 1 m and 2 m trials 2 ; m ; l
                         ^
                pretend.txt:14:6: b is not a free symbol (fault: not-free)
                    root x7 = b where q = Q between 1 m and 2 m ; m ; l
                         ^
                pretend.txt:15:6: y is not defined above (fault: symbol-unknown)
                    root x8 = y where q = Q between 1 m and 2 m ; m ; l
                         ^
                pretend.txt:16:6: h rests on h, which is bound here (fault: rests-on-itself)
                    root x9 = h where q = Q between h and 2 m ; m ; l
                         ^
                pretend.txt:17:6: the formula comes out as length, but m3/s is length^3 time^-1 (fault: unlike-dimensions)
                    root x10 = h where q = Q between 1 m3/s and 2 m3/s ; m3/s ; l
                         ^
                pretend.txt:18:52: y is not defined above (fault: symbol-unknown)
                    root x11 = h where q = Q between 1 m and 2 m below y ; m ; l
                                                                       ^
                pretend.txt:19:37: found the end where "and" was expected (fault: syntax)
                    root x12 = h where q = Q between 1 m ; m ; l
                                                        ^
                pretend.txt:20:14: found "with" where "where" was expected (fault: syntax)
                    root x13 = h with q = Q ; m ; l
                                 ^
                pretend.txt:21:4: h and its value differ in dimension (fault: unlike-dimensions)
                    at h = 1 s : r = q
                       ^
                pretend.txt:22:4: h rests on h, which is bound here (fault: rests-on-itself)
                    at h = 2*h : r2 = q
                       ^
                pretend.txt:23:4: b is not a free symbol (fault: not-free)
                    at b = 2 m : r3 = q
                       ^
                pretend.txt:24:4: y is not defined above (fault: symbol-unknown)
                    at h = 2 m : r4 = y
                       ^
                pretend.txt:25:10: found the end where ":" was expected (fault: syntax)
                    at h = 2 m
                             ^
                pretend.txt:26:8: y is not defined above (fault: symbol-unknown)
                    at h = y : r5 = q
                           ^
                pretend.txt:28:7: the sides of the limit differ in dimension (fault: unlike-dimensions)
                    limit b <= 2 ; l ; A
                          ^
                pretend.txt:29:7: a limit is a <= b, or a <= b <= c (fault: limit-unclear)
                    limit b ; l ; A
                          ^
                pretend.txt:30:7: a limit is a <= b, or a <= b <= c (fault: limit-unclear)
                    limit b <= b <= b <= b ; l ; A
                          ^
                pretend.txt:31:7: q rests on the free symbol h and has no value by itself; name one with at (fault: no-value)
                    limit q <= Q ; l ; A
                          ^
                pretend.txt:32:7: h is free and has no value by itself; bind it with at (fault: no-value)
                    limit h <= b ; l ; A
                          ^
                pretend.txt:33:21: a condition is needed here, such as h < 2 ft (fault: not-a-condition)
                    limit b <= 2 m when b ; l ; A
                                        ^
                pretend.txt:34:7: h is free and has no value by itself; bind it with at (fault: no-value)
                    limit b <= 2 m when h < 1 m ; l ; A
                          ^
                pretend.txt:35:7: the scale of the limit differs from its sides in dimension (fault: unlike-dimensions)
                    limit b <= 2 m scale 2 s ; l ; A
                          ^
                pretend.txt:36:7: h is free and has no value by itself; bind it with at (fault: no-value)
                    limit b <= 2 m scale h ; l ; A
                          ^
                pretend.txt:37:7: a limit names its source (fault: source-missing)
                    limit b <= 2 m ; l
                          ^
                pretend.txt:38:22: X is not a source of this sheet (fault: source-unknown)
                    limit b <= 2 m ; l ; X
                                         ^
                pretend.txt:39:9: found "<" where an operation or the end was expected (fault: syntax)
                    limit b < 2 m ; l ; A
                            ^
                pretend.txt:40:12: y is not defined above (fault: symbol-unknown)
                    limit b <= y ; l ; A
                               ^
                pretend.txt:41:8: h and an end of its table differ in dimension (fault: unlike-dimensions)
                    rating h from 1 s to 2 m steps 3 : q
                           ^
                pretend.txt:42:8: a rating takes 1 step or more (fault: steps-few)
                    rating h from 1 m to 2 m steps 0 : q
                           ^
                pretend.txt:43:8: k is free and has no value by itself; bind it with at (fault: no-value)
                    rating h from 1 m to k steps 3 : q
                           ^
                pretend.txt:44:26: found ":" where "steps" was expected (fault: syntax)
                    rating h from 1 m to 2 m : q
                                             ^
                pretend.txt:45:8: y is not defined above (fault: symbol-unknown)
                    rating h from 1 m to 2 m steps 3 : y
                           ^
                pretend.txt:46:6: write: give water level = z_u (fault: give-unclear)
                    give water level
                         ^
                pretend.txt:47:6: y is not defined above (fault: symbol-unknown)
                    give water level = y
                         ^
                pretend.txt:48:6: q rests on the free symbol h and has no value by itself; name one with at (fault: no-value)
                    give water level = q
                         ^
                pretend.txt:49:6: "water table" is no role; roles are flow, flow through one, units in service, water level, energy level, rapid depth, head at the gauge, state of flow, measurement, reason, standing of the level, remark, scale of levels, control width (fault: role-unknown)
                    give water table = b
                         ^""");
    }

    @Test
    void faultsOfIncludes() {
        Texts texts = new Texts()
                .method("pretend", """
                        method Pretend
                        include part
                        include part subscript
                        include nothing
                        include pretend
                        include part2
                        requires B ; m ; l
                        line x = B ; m ; l""")
                .method("part", """
                        requires b ; m ; l
                        line A = b ; m ; l""")
                .method("part2", """
                        include part3""")
                .method("part3", """
                        include part2""");
        assertThat(faults(texts)).isEqualTo("""
                part.txt:1:10: b is not defined above (fault: symbol-unknown)
                    requires b ; m ; l
                             ^
                pretend.txt:3:1: write: include file, or: include file subscript s (fault: include-unclear)
                    include part subscript
                    ^
                pretend.txt:4:1: there is no text methods/nothing.txt to include (fault: include-missing)
                    include nothing
                    ^
                pretend.txt:5:1: pretend includes itself (fault: include-circle)
                    include pretend
                    ^
                part3.txt:1:1: part2 includes itself (fault: include-circle)
                    include part2
                    ^
                pretend.txt:7:10: B is not defined above (fault: symbol-unknown)
                    requires B ; m ; l
                             ^""");
    }

    @Test
    void faultsOfAnIncludeWithSubscript() {
        Texts texts = new Texts().method("pretend", """
                        method Pretend
                        entry b_1 ; m ; l
                        entry b_2 ; s ; l
                        include part subscript 1
                        include part subscript 2
                        line S = A_1 + A_2 + A_x1 ; m2 ; l""").method("part", """
                        requires b ; m ; l
                        line A = b^2 ; m2 ; l
                        line A_x = b + y ; m2 ; l""");
        assertThat(faults(texts)).isEqualTo("""
                part.txt:3:6: y_1 is not defined above (fault: symbol-unknown)
                    line A_x = b + y ; m2 ; l
                         ^
                part.txt:1:10: b_2 is of another dimension where this text is included (fault: unlike-dimensions)
                    requires b ; m ; l
                             ^
                part.txt:2:6: the formula comes out as time^2, but m2 is length^2 (fault: unlike-dimensions)
                    line A = b^2 ; m2 ; l
                         ^
                part.txt:3:6: y_2 is not defined above (fault: symbol-unknown)
                    line A_x = b + y ; m2 ; l
                         ^""");
    }

    @Test
    void aFaultInAContinuationLineIsShownThere() {
        Texts texts = new Texts().method("pretend", """
                        method Pretend
                           # remark
                        entry a ; m
                              ; label "with ; and #" goes on   # remark
                        \t; any sign
                        line   x = a
                            + b     # b is not there
                            + c ; m ; l""");
        assertThat(faults(texts)).isEqualTo("""
                pretend.txt:7:7: b is not defined above (fault: symbol-unknown)
                        + b     # b is not there
                          ^""");
    }

    @Test
    void aSheetThatIsNotThereIsAFault() {
        MethodException faults =
                catchThrowableOfType(MethodException.class, () -> new MethodReader(new Texts()).read("nothing"));
        assertThat(faults.faults())
                .containsExactly(
                        new TextFault("nothing.txt", 1, 1, "there is no such method sheet", "method-missing", ""));
    }

    @Test
    void geometryComparesWhatIsTypedAndSaysItInWords() {
        Texts texts = new Texts().method("pretend", """
                        method Pretend
                        entry d ; m ; bore
                        entry D ; m ; pipe
                        line b = d/D ; 1 ; ratio
                        geometry d < D ; smaller
                        geometry b < 1 ; smaller
                        geometry d < 1 ; smaller
                        geometry 1 < 2 ; smaller
                        geometry d < D
                        geometry d ; smaller""");
        assertThat(faults(texts)).isEqualTo("""
                pretend.txt:6:10: b is not typed once for the device; geometry compares entries, choices and constants (fault: not-an-entry)
                    geometry b < 1 ; smaller
                             ^
                pretend.txt:7:10: length compared with a pure number; both sides must be alike (fault: unlike-dimensions)
                    geometry d < 1 ; smaller
                             ^
                pretend.txt:8:10: geometry compares at least one entry (fault: not-an-entry)
                    geometry 1 < 2 ; smaller
                             ^
                pretend.txt:9:10: say in words what is asked: geometry d < D ; the bore is smaller than the pipe (fault: label-missing)
                    geometry d < D
                             ^
                pretend.txt:10:10: a condition is needed here, such as h < 2 ft (fault: not-a-condition)
                    geometry d ; smaller
                             ^""");
    }

    private static String faults(Texts texts) {
        texts.table("pretend-sizes", "size,C [1],d [mm],kind\nsmall,2.5,3,narrow\nlarge,3.5,,wide\n")
                .table("pretend-curve", "r [1],c [1],e [mm]\n0.2,0.5,1\n0.4,0.6,3\n0.8,0.7,4\n")
                .table("pretend-falling", "r [1],c [1]\n0.4,0.5\n0.2,0.6\n")
                .table("pretend-broken", "r [1],c [1]\n0.4,x\n0.2,0.6\n");
        MethodException faults =
                catchThrowableOfType(MethodException.class, () -> new MethodReader(texts).read("pretend"));
        return faults.getMessage();
    }
}
