/*
 * Excel's formulas in A1 notation.
 *
 * The rules say what is well formed; how tightly operators bind is said once, in BinaryOp, and
 * applied by OperatorFolding. So a chain of thousands of terms is one flat list, and only
 * parentheses and calls nest.
 *
 * White space between two references is the intersection operator. The lexer cannot tell, so
 * TokenReader turns such a SPACE into INTERSECT and drops the others.
 */
grammar ExcelFormula;

tokens { INTERSECT }

formula : union EOF ;

union : expression (',' expression)* ;

expression : term (operator term)* ;

operator : '=' | '<>' | '<' | '<=' | '>' | '>=' | '&' | '+' | '-' | '*' | '/' | '^' ;

// A sign binds tighter than %, and % tighter than ^.
term : prefix* item ((':' | INTERSECT) item)* PERCENT* ;

prefix : '+' | '-' | '@' ;

item : primary suffix* ;

// What A1 spills, and the call of a LAMBDA or of a name that a space keeps from its parenthesis.
suffix : '#' | '(' arguments ')' ;

primary
  : NUMBER                                   # number
  | STRING                                   # string
  | BOOLEAN                                  # boolean
  | SHEET? ERROR lost?                       # error
  | SHEET? FUNCTION arguments ')'            # call
  | SHEET? CELL                              # cell
  | SHEET? NAME                              # name
  | SHEET? TABLE                             # table
  | SHEET? (COLUMN | ROW)                    # half
  | SHEET NUMBER                             # half
  | '(' union ')'                            # group
  | '{' row (';' row)* '}'                   # array
  ;

// The rest of a reference whose sheet is gone: #REF!A1
lost : CELL | NAME | COLUMN | ROW | ERROR ;

arguments : argument (',' argument)* ;

argument : expression? ;

row : element (',' element)* ;

element : ('+' | '-')? NUMBER | STRING | BOOLEAN | ERROR | ;

PERCENT : '%' ;

NUMBER : (DIGIT+ ('.' DIGIT*)? | '.' DIGIT+) ([eE] [+-]? DIGIT+)? ;

STRING : '"' (~'"' | '""')* '"' ;

BOOLEAN : [Tt] [Rr] [Uu] [Ee] | [Ff] [Aa] [Ll] [Ss] [Ee] ;

ERROR : '#' [A-Za-z_]+ [!?] | '#' [Dd] [Ii] [Vv] '/0!' | '#' [Nn] '/' [Aa] | '#' [Gg] [Ee] [Tt] [A-Za-z_]+ ;

// The last form is a dollar sign, the sheet, and a dot, as other programs write it.
SHEET
  : BOOK (SHEETCHAR+ (':' SHEETCHAR+)?)? '!'
  | '$'? SHEETCHAR+ '!'
  | '$'? QUOTED (':' QUOTED)? '!'
  | '$' (WORD+ | QUOTED) '.'
  ;

CELL : '$'? LETTERS '$'? [1-9] DIGIT* ;

COLUMN : '$' LETTERS ;

ROW : '$' DIGIT+ ;

FUNCTION : NAMESTART NAMECHAR* '(' ;

NAME : NAMESTART NAMECHAR* ;

// A structured reference as a whole; StructuredReference takes it apart.
TABLE : (NAMESTART NAMECHAR*)? '[' (PLAIN | '[' PLAIN* ']')* ']' ;

SPACE : [ \t\r\n\f\u00A0\u3000]+ ;

OTHER : . ;

fragment DIGIT : [0-9] ;
fragment LETTERS : [A-Za-z] ([A-Za-z] [A-Za-z]?)? ;
fragment WORD : [A-Za-z0-9_] | FOREIGN ;
fragment NAMESTART : [A-Za-z_\\] | FOREIGN ;
fragment NAMECHAR : [A-Za-z0-9_.\\?] | FOREIGN ;
fragment SHEETCHAR : [A-Za-z0-9_.\\?] | FOREIGN ;
fragment BOOK : '[' ~[[\]]+ ']' ;
fragment QUOTED : '\'' (~'\'' | '\'\'')+ '\'' ;
fragment PLAIN : ~['[\]] | '\'' . ;
// Letters of every other script; ranges kept coarse so that the lexer starts fast.
fragment FOREIGN : [\u00A1-\u1FFF\u2010-\u2FFF\u3001-\u{10FFFF}] ;
